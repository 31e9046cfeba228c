import { Button } from './Button.tsx';

type PagerProps = { page: number; pageSize: number; total: number; go: (page: number) => void };

/** “51–100 of 231”, and the way to the neighbouring pages. */
export function Pager({ page, pageSize, total, go }: PagerProps) {
  if (total <= pageSize && page === 1) return null;
  const last = Math.max(1, Math.ceil(total / pageSize));
  const from = Math.min(total, (page - 1) * pageSize + 1);
  return (
    <nav aria-label="Pages" className="mt-3 flex items-center justify-between gap-3 print:hidden">
      <p className="text-sm text-muted">
        {from}–{Math.min(total, page * pageSize)} of {total}
      </p>
      <div className="flex gap-2">
        <Button disabled={page <= 1} onClick={() => go(page - 1)}>
          Previous
        </Button>
        <Button disabled={page >= last} onClick={() => go(page + 1)}>
          Next
        </Button>
      </div>
    </nav>
  );
}
