export function UploadPage() {
  return <h1>Upload</h1>;
}
