/** Said to screen readers at once; shown only when waiting takes long enough to notice. */
export function Loading() {
  return (
    <div role="status" className="p-6 text-muted">
      <span className="inline-block animate-pulse">Loading…</span>
    </div>
  );
}
