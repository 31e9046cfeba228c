import type { InclineReading } from '../../../shared/schemas/frictionTest.ts';

export type ReadingKind = 'height over base' | 'angle';

export type ParsedReadings =
  { ok: true; readings: InclineReading[] } | { ok: false; line: number; reason: string };

const number = /^[0-9]+(?:\.[0-9]+)?$/;

/**
 * Readings as typed or pasted, one a line: `92 300` or `92/300` (height and base, mm), or `17.1`
 * (angle, °). Empty lines are passed over.
 */
export function parseReadings(text: string, kind: ReadingKind): ParsedReadings {
  const readings: InclineReading[] = [];
  for (const [index, raw] of text.split('\n').entries()) {
    const cells = raw
      .trim()
      .split(/[\s/;]+/)
      .filter((cell) => cell !== '');
    if (cells.length === 0) continue;
    const wanted = kind === 'angle' ? 1 : 2;
    const fault = (reason: string): ParsedReadings => ({ ok: false, line: index + 1, reason });
    if (cells.length !== wanted) {
      return fault(
        kind === 'angle'
          ? 'write one angle, such as 17.1'
          : 'write height and base, such as 92 300',
      );
    }
    const bad = cells.find((cell) => !number.test(cell));
    if (bad !== undefined) return fault(`“${bad}” is not a number; use a decimal point`);
    const [first = 0, second = 0] = cells.map(Number);
    if (first <= 0 || (wanted === 2 && second <= 0)) return fault('must be above 0');
    if (kind === 'angle' && first >= 89) return fault('an angle must be below 89°');
    readings.push(kind === 'angle' ? { angleDeg: first } : { heightMm: first, baseMm: second });
  }
  return readings.length === 0
    ? { ok: false, line: 1, reason: 'give at least one reading' }
    : { ok: true, readings };
}
