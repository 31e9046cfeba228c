/** The values before and after, for those who want to see them. */
export function EventChange({ before, after }: { before: unknown; after: unknown }) {
  if (isNothing(before) && isNothing(after)) return null;
  return (
    <details className="text-sm">
      <summary className="cursor-pointer py-1 text-muted">before and after</summary>
      <div className="grid gap-2 sm:grid-cols-2">
        <Value title="Before" value={before} />
        <Value title="After" value={after} />
      </div>
    </details>
  );
}

function Value({ title, value }: { title: string; value: unknown }) {
  return (
    <div className="min-w-0">
      <p className="font-bold">{title}</p>
      <pre
        tabIndex={0}
        role="region"
        aria-label={title}
        className="max-h-72 overflow-auto rounded border border-line bg-raised p-2 text-xs"
      >
        {isNothing(value) ? '–' : JSON.stringify(value, null, 1)}
      </pre>
    </div>
  );
}

function isNothing(value: unknown): boolean {
  return value === null || value === undefined;
}
