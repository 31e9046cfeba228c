export function SummaryPage() {
  return <h1>Summary</h1>;
}
