const iso =
  /^(\d{4})-(\d{2})-(\d{2})(?:[T ](\d{2}):(\d{2})(?::(\d{2})(?:[.,](\d{1,9}))?)?(Z|[+-]\d{2}:?\d{2})?)?$/;
const dotted = /^(\d{1,2})\.(\d{1,2})\.(\d{4})(?:[ ,]+(\d{1,2}):(\d{2})(?::(\d{2}))?)?$/;

/**
 * A date and time as ISO 8601 UTC: ISO 8601 itself, or day.month.year. Without an offset it is
 * taken as UTC. Dates with slashes are not read: nobody can tell 3/4 from 4/3.
 *
 * @returns null when it is not understood
 */
export function parseTime(written: string): string | null {
  const text = written.trim();
  if (text.length > 40) return null;
  const found = iso.exec(text);
  if (found) {
    const [, year, month, day, hour, minute, second, fraction, offset] = found;
    const instant = utc(year, month, day, hour, minute, second);
    if (instant === null) return null;
    const milliseconds = Math.floor(Number(`0.${fraction ?? '0'}`) * 1000);
    return new Date(instant + milliseconds - offsetOf(offset)).toISOString();
  }
  const german = dotted.exec(text);
  if (!german) return null;
  const [, day, month, year, hour, minute, second] = german;
  const instant = utc(year, month, day, hour, minute, second);
  return instant === null ? null : new Date(instant).toISOString();
}

/** Milliseconds since 1970, or null for a date that does not exist (31 April, 25:00). */
function utc(...parts: (string | undefined)[]): number | null {
  const [year = 0, month = 1, day = 1, hour = 0, minute = 0, second = 0] = parts.map((part) =>
    part === undefined ? undefined : Number(part),
  );
  if (year < 1970 || hour > 23 || minute > 59 || second > 59) return null;
  const instant = Date.UTC(year, month - 1, day, hour, minute, second);
  const date = new Date(instant);
  return date.getUTCMonth() === month - 1 && date.getUTCDate() === day ? instant : null;
}

function offsetOf(offset: string | undefined): number {
  if (offset === undefined || offset === 'Z') return 0;
  const digits = offset.replace(':', '');
  const minutes = Number(digits.slice(1, 3)) * 60 + Number(digits.slice(3, 5));
  return (digits.startsWith('-') ? -1 : 1) * minutes * 60_000;
}
