export function BuildUpPage() {
  return <h1>BuildUp</h1>;
}
