import type { ReactNode } from 'react';

type PageHeaderProps = { title: string; children?: ReactNode; actions?: ReactNode };

/** A page's name, the sentence that answers its person's question, and what can be done here. */
export function PageHeader({ title, children, actions }: PageHeaderProps) {
  return (
    <header className="mb-5 flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
      <div className="min-w-0 max-w-3xl">
        <h1>{title}</h1>
        {children !== undefined && <div className="mt-1 text-lg text-ink">{children}</div>}
      </div>
      {actions !== undefined && <div className="flex flex-wrap gap-2">{actions}</div>}
    </header>
  );
}
