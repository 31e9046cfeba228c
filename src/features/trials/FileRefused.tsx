import { ApiError } from '../../lib/api.ts';
import { Button } from '../../ui/Button.tsx';

/** Why a file could not even be read, kindly, and the way on: another file, or the same again. */
export function FileRefused({
  fileName,
  error,
  retry,
}: {
  fileName: string;
  error: Error;
  retry: () => void;
}) {
  const passing = error instanceof ApiError && [0, 429, 503].includes(error.status);
  return (
    <div role="alert" className="rounded-lg border border-lost bg-raised px-6 py-5">
      <p className="font-bold text-lost">
        <span className="break-all">{fileName}</span> could not be read
      </p>
      <p className="mt-1">{error.message}</p>
      {passing && (
        <Button className="mt-3" onClick={retry}>
          Try again
        </Button>
      )}
    </div>
  );
}
