export function HistoryPage() {
  return <h1>History</h1>;
}
