import type { ReactNode } from 'react';

type PanelProps = { title: string; actions?: ReactNode; className?: string; children: ReactNode };

/** A titled part of a page. */
export function Panel({ title, actions, className = '', children }: PanelProps) {
  return (
    <section className={`rounded-lg border border-line bg-raised print:border-0 ${className}`}>
      <header className="flex flex-wrap items-center justify-between gap-2 border-b border-line px-4 py-2.5">
        <h2>{title}</h2>
        {actions}
      </header>
      <div className="p-4">{children}</div>
    </section>
  );
}
