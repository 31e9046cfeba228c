import type { ReactNode } from 'react';

/** Something that is there when asked for; it always prints. */
export function Disclosure({ title, children }: { title: string; children: ReactNode }) {
  return (
    <details className="group rounded-lg border border-line bg-raised">
      <summary className="cursor-pointer px-4 py-2.5 font-bold hover:bg-hover">{title}</summary>
      <div className="overflow-x-auto border-t border-line p-4">{children}</div>
    </details>
  );
}
