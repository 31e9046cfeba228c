import { useRouteError } from 'react-router';
import { ErrorState } from '../ui/ErrorState.tsx';

/** What a page shows when it could not be drawn. */
export function PageError() {
  return (
    <div className="mx-auto max-w-2xl p-6">
      <ErrorState page error={useRouteError()} retry={() => window.location.reload()} />
    </div>
  );
}
