import type { ReactNode } from 'react';

/** A remark above the rest: news by default, a warning where something needs a decision. */
export function Notice({
  tone = 'news',
  children,
}: {
  tone?: 'news' | 'warning';
  children: ReactNode;
}) {
  const edge = tone === 'warning' ? 'border-slipped' : 'border-accent';
  return (
    <div role="status" className={`border-l-4 ${edge} bg-raised px-4 py-2.5`}>
      {children}
    </div>
  );
}
