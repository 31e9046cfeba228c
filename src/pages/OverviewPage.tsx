export function OverviewPage() {
  return <h1>Overview</h1>;
}
