export function TrialsPage() {
  return <h1>Trials</h1>;
}
