import type { ReactNode } from 'react';

/** Nothing here yet: why, and the next step. */
export function EmptyState({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="rounded-lg border border-dashed border-control px-6 py-8 text-center">
      <p className="font-bold">{title}</p>
      {children !== undefined && <div className="mt-2 text-muted">{children}</div>}
    </div>
  );
}
