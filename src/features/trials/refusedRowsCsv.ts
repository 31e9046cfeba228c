import { type LogProblem } from '../../../shared/schemas/trialLog.ts';

/**
 * Refused rows as CSV (RFC 4180, UTF-8 with a byte-order mark so that spreadsheets read it), each
 * with its reason. A text that a spreadsheet would take for a formula is made plain with `'`.
 */
export function refusedRowsCsv(problems: readonly LogProblem[]): string {
  const lines = problems.map(({ row, column, value, reason }) =>
    [row === 0 ? '' : String(row), text(column ?? ''), text(value ?? ''), text(reason)].join(','),
  );
  return `\uFEFF${['row,column,value,reason', ...lines].join('\r\n')}\r\n`;
}

/** What makes a spreadsheet read a text as a formula, their full-width forms included. */
const formulaStarts = [...'=+-@\t\r\0\uFF1D\uFF0B\uFF0D\uFF20'];

function text(value: string): string {
  const safe = formulaStarts.includes(value.charAt(0)) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
