/** Where to go after signing in: an address of this application, or the overview. */
export function safeNext(next: string | null): string {
  if (next === null || !next.startsWith('/')) return '/';
  const base = 'http://tautline.invalid';
  const url = URL.canParse(next, base) ? new URL(next, base) : null;
  if (url === null || url.origin !== base) return '/';
  return url.pathname + url.search + url.hash;
}
