import { Suspense } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router';
import { SignInForm } from '../features/session/SignInForm.tsx';
import { safeNext } from '../lib/safeNext.ts';
import { useUser } from '../lib/session.ts';
import { useTitle } from '../lib/useTitle.ts';
import { Loading } from '../ui/Loading.tsx';

export function SignInPage() {
  useTitle('Sign in');
  return (
    <main className="mx-auto flex min-h-screen max-w-sm flex-col justify-center px-4 py-10">
      <h1 className="text-3xl">Tautline</h1>
      <p className="mt-1 mb-6 text-muted">
        Acceleration limits for friction-held rotary fixtures: tried, released and kept true.
      </p>
      <Suspense fallback={<Loading />}>
        <Form />
      </Suspense>
    </main>
  );
}

function Form() {
  const user = useUser();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const next = safeNext(search.get('next'));
  if (user !== null) return <Navigate to={next} replace />;
  return <SignInForm done={() => void navigate(next, { replace: true })} />;
}
