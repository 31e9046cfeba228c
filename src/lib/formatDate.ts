const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const minute = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
});

/** “14 Nov 2026”; a dash where there is none. */
export function formatDay(iso: string | null): string {
  return iso === null ? '–' : day.format(new Date(iso));
}

/** “14 Nov 2026, 09:12”, in the reader's time zone. */
export function formatMinute(iso: string | null): string {
  return iso === null ? '–' : minute.format(new Date(iso));
}
