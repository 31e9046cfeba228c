import { type ParityPoint } from '../../../shared/schemas/overview.ts';

/** What the parity picture shows, in words. */
export function parityAlternative(points: readonly ParityPoint[]): string {
  const fitted = points.filter(({ fitted: { estimate } }) => estimate !== null);
  if (fitted.length === 0) return 'Theory limit against fitted limit: nothing to compare yet.';
  const below = fitted.filter(({ theory, fitted: { upper } }) => upper !== null && upper < theory);
  const names = below.map(({ code, label }) => `${code} ${label}`).join(', ');
  return (
    `Theory limit against fitted limit of ${fitted.length} configurations. ` +
    (below.length === 0
      ? 'None lies clearly below the line where both agree.'
      : `Clearly below the line where both agree: ${names}.`)
  );
}
