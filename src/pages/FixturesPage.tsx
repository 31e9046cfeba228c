export function FixturesPage() {
  return <h1>Fixtures</h1>;
}
