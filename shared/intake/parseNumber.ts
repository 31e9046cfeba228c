import type { LogMapping } from '../schemas/trialLog.ts';

export type Decimal = LogMapping['decimal'];

export type ParsedNumber = { ok: true; value: number } | { ok: false; reason: string };

/** Digits, one decimal point, a decimal exponent; nothing a programming language adds to that. */
const grammar = /^[+-]?(?:[0-9]+(?:\.[0-9]*)?|\.[0-9]+)(?:[eE][+-]?[0-9]{1,3})?$/;

const longest = 40;

/**
 * A number as a person writes it, by a strict grammar and the log's declared decimal sign. What is
 * not understood is refused with a remedy, never guessed: `''`, `0x10`, `1e400`, `NaN`,
 * `Infinity`, `1_000`, `1,5` in a log with decimal points, `1.234,5`.
 */
export function parseNumber(written: string, decimal: Decimal): ParsedNumber {
  const text = written.trim().replace(/^\u2212/, '-');
  if (text === '') return refuse('is empty: enter a number');
  if (text.length > longest) return refuse('is too long for a number');
  const other = decimal === '.' ? ',' : '.';
  const shown = decimal === '.' ? 'point' : 'comma';
  if (text.includes(other)) {
    if (/^[+-]?[0-9]{1,3}[.,][0-9]{3}$/.test(text)) {
      return refuse(
        `is ambiguous: its “${other}” may part thousands or decimals; this log uses a decimal ${shown}`,
      );
    }
    return refuse(
      `has a “${other}” while this log uses a decimal ${shown}: choose the decimal sign, or write it one way`,
    );
  }
  const plain = decimal === ',' ? text.replace(',', '.') : text;
  if (!grammar.test(plain)) {
    return refuse('is not a number: write digits only, with the unit in the header');
  }
  const value = Number(plain);
  if (!Number.isFinite(value)) return refuse('is too large for a number');
  return { ok: true, value };
}

function refuse(reason: string): ParsedNumber {
  return { ok: false, reason };
}
