export function BoundaryPage() {
  return <h1>Boundary</h1>;
}
