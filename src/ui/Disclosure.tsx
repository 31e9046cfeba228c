import type { ReactNode } from 'react';

/** Something that is there when asked for; it always prints. */
export function Disclosure({ title, children }: { title: string; children: ReactNode }) {
  return (
    <details className="rounded-lg border border-line bg-raised print:[&::details-content]:block print:[&::details-content]:h-auto print:[&::details-content]:[content-visibility:visible]">
      <summary className="cursor-pointer px-4 py-2.5 font-bold hover:bg-hover">{title}</summary>
      <div className="overflow-x-auto border-t border-line p-4">{children}</div>
    </details>
  );
}
