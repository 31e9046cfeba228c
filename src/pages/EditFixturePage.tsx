export function EditFixturePage() {
  return <h1>EditFixture</h1>;
}
