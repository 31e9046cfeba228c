import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readLog, type LogContext, type LogReading } from '../../../shared/intake/readLog.ts';
import { outcomes, type Outcome } from '../../../shared/schemas/trial.ts';

const positions = [20, 45, 70, 95];
const context: LogContext = {
  configurations: positions.map((positionMm, index) => ({
    id: index + 1,
    label: `${positionMm} mm`,
    positionMm,
  })),
  slide: { minMm: 10, maxMm: 130 },
  maxAcceleration: null,
};

type Trial = {
  positionMm: number;
  acceleration: number;
  outcome: Outcome;
  order: number;
  remark: string;
};

const trial: fc.Arbitrary<Trial> = fc.record({
  positionMm: fc.constantFrom(...positions),
  acceleration: fc.integer({ min: 1, max: 9_999_999 }).map((n) => n / 1e4),
  outcome: fc.constantFrom(...outcomes),
  order: fc.integer({ min: 1, max: 999 }),
  remark: fc
    .string({ maxLength: 12, unit: fc.constantFrom(...'ab ,;"\'é=–0') })
    .map((text) => text.replace(/\s+/g, ' ').trim()),
});

type Dialect = {
  delimiter: ',' | ';' | '\t';
  decimal: '.' | ',';
  lineEnd: string;
  bom: boolean;
  preamble: number;
};

const dialect: fc.Arbitrary<Dialect> = fc.record({
  delimiter: fc.constantFrom(',', ';', '\t'),
  decimal: fc.constantFrom('.', ','),
  lineEnd: fc.constantFrom('\n', '\r\n', '\r'),
  bom: fc.boolean(),
  preamble: fc.integer({ min: 0, max: 3 }),
});

const headers = ['Run', 'Position [mm]', 'Remarks', 'Acceleration [rad/s²]', 'Outcome'];

function write(trials: readonly Trial[], form: Dialect, order: readonly number[]): Uint8Array {
  const number = (value: number) => String(value).replace('.', form.decimal);
  const quote = (text: string) => `"${text.replaceAll('"', '""')}"`;
  const cells = (row: readonly string[]) => order.map((index) => row[index]).join(form.delimiter);
  const lines = [
    ...Array<string>(form.preamble).fill('Slip trials of an invented fixture'),
    cells(headers.map(quote)),
    ...trials.map(({ order: run, positionMm, remark, acceleration, outcome }) =>
      cells([
        number(run),
        number(positionMm),
        quote(remark),
        quote(number(acceleration)),
        outcome.toUpperCase(),
      ]),
    ),
  ];
  const text = (form.bom ? '\uFEFF' : '') + lines.join(form.lineEnd) + form.lineEnd;
  return new TextEncoder().encode(text);
}

function back({ rows }: LogReading): Trial[] {
  return rows.map(({ positionMm, acceleration, outcome, order, remark }) => ({
    positionMm,
    acceleration,
    outcome,
    order: order ?? Number.NaN,
    remark: remark ?? '',
  }));
}

describe('writing a log and reading it back', () => {
  it('gives every trial back, in every dialect and order of columns', () => {
    fc.assert(
      fc.property(
        fc.array(trial, { minLength: 1, maxLength: 20 }),
        dialect,
        fc.shuffledSubarray([0, 1, 2, 3, 4], { minLength: 5 }),
        (trials, form, order) => {
          const reading = readLog(write(trials, form, order), { decimal: form.decimal }, context);
          expect(reading.problems).toEqual([]);
          expect(reading.mapping).toMatchObject({
            delimiter: form.delimiter,
            headerLine: form.preamble + 1,
          });
          expect(back(reading)).toEqual(trials);
        },
      ),
      { numRuns: 200 },
    );
  });

  it('accepts or refuses every row, whatever the cells hold', () => {
    const cell = fc.string({
      maxLength: 8,
      unit: fc.constantFrom(...'0123456789.,eE+-xheld "\u0301'),
    });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(cell, cell, cell), { minLength: 1, maxLength: 15 }),
        (cells) => {
          const quote = (text: string) => `"${text.replaceAll('"', '""')}"`;
          const kept = cells.filter((row) => row.some((text) => text.trim() !== ''));
          const text = [
            'position mm,alpha rad/s²,outcome',
            ...kept.map((row) => row.map(quote).join(',')),
          ];
          const reading = readLog(new TextEncoder().encode(`${text.join('\n')}\n`), {}, context);
          if (kept.length === 0) return;
          expect(reading.rows.length + reading.refused).toBe(kept.length);
          expect(reading.problems.length).toBe(reading.refused);
          for (const { acceleration } of reading.rows) expect(acceleration).toBeGreaterThan(0);
        },
      ),
    );
  });

  it('never throws on bytes of any kind', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), (bytes) => {
        const reading = readLog(bytes, {}, context);
        expect(reading.rows.length === 0 || reading.refusal === null).toBe(true);
      }),
    );
  });
});
