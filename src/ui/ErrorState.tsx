import { ApiError } from '../lib/api.ts';
import { Button } from './Button.tsx';

type ErrorStateProps = {
  error: unknown;
  retry?: () => void;
  /** True where this is all there is on the page: its title is then the page's heading. */
  page?: boolean;
};

/** What went wrong, in the server's words, and the way on. */
export function ErrorState({ error, retry, page = false }: ErrorStateProps) {
  const { title, text } = wordsOf(error);
  const Title = page ? 'h1' : 'p';
  return (
    <div role="alert" className="rounded-lg border border-lost bg-raised px-6 py-6">
      <Title className="text-base font-bold text-lost">{title}</Title>
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
