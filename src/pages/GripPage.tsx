export function GripPage() {
  return <h1>Grip</h1>;
}
