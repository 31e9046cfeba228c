import { ButtonLink } from './ButtonLink.tsx';

/** Somebody is where their roles do not reach; nothing is wrong with them or the page. */
export function ForbiddenState({ what }: { what: string }) {
  return (
    <div role="alert" className="rounded-lg border border-control px-6 py-8 text-center">
      <h1>Your roles do not allow this</h1>
      <p className="mt-2 mb-4 text-muted">
        You may not {what}. An administrator can change your roles.
      </p>
      <ButtonLink to="/">Back to the overview</ButtonLink>
    </div>
  );
}
