export function NewFixturePage() {
  return <h1>NewFixture</h1>;
}
