import { ApiError } from '../lib/api.ts';
import { Button } from './Button.tsx';

/** What went wrong, in the server's words, and the way on. */
export function ErrorState({ error, retry }: { error: unknown; retry?: () => void }) {
  const { title, text } = wordsOf(error);
  return (
    <div role="alert" className="rounded-lg border border-lost bg-raised px-6 py-6">
      <p className="font-bold text-lost">{title}</p>
      <p className="mt-1">{text}</p>
      {retry !== undefined && (
        <Button className="mt-4" onClick={retry}>
          Try again
        </Button>
      )}
    </div>
  );
}

function wordsOf(error: unknown): { title: string; text: string } {
  if (!(error instanceof ApiError)) {
    return {
      title: 'Something went wrong',
      text: 'Reload the page. Nothing that was stored is lost.',
    };
  }
  if (error.status === 403) return { title: 'Not allowed', text: error.message };
  if (error.status === 404) return { title: 'Not found', text: error.message };
  return { title: error.problem.title, text: error.message };
}
