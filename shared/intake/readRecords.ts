import { CsvError, parse } from 'csv-parse/browser/esm/sync';
import type { Delimiter } from './findHeader.ts';

/** One row of the file: the line it begins on, counted from 1, and its cells as written. */
export type LogRecord = { row: number; cells: string[] };

export type Records =
  | { ok: true; headers: string[]; records: LogRecord[] }
  | { ok: false; row: number; reason: string };

const largestRecord = 65_536;
const mostColumns = 256;

/** More rows than any hand or bench makes in a day; beyond it the file is split. */
const mostRows = 100_000;

/**
 * Splits the table of a log into rows of cells. Rows stay arrays: a header never becomes a key of
 * an object. Blank lines are skipped.
 *
 * @param text - with `\n` line ends, from the header line on
 * @param headerLine - its line in the file, counted from 1
 */
export function readRecords(text: string, delimiter: Delimiter, headerLine: number): Records {
  const rows: LogRecord[] = [];
  let trouble: { row: number; reason: string } | null = null;
  try {
    // as bytes: the browser build turns a text into them by hand, ten times slower
    parse(new TextEncoder().encode(text), {
      delimiter,
      record_delimiter: '\n',
      relax_column_count: true,
      relax_quotes: true,
      skip_empty_lines: true,
      trim: true,
      max_record_size: largestRecord,
      to: mostRows + 2,
      info: true,
      on_record: (found: unknown) => {
        const { record, info } = found as { record: string[]; info: { lines: number } };
        const extraLines = record.reduce((sum, cell) => sum + count(cell, '\n'), 0);
        const row = headerLine + info.lines - 1 - extraLines;
        if (record.length > mostColumns) {
          trouble ??= {
            row,
            reason: `Line ${row} has ${record.length} columns, more than ${mostColumns}: keep the columns of the trials only.`,
          };
        }
        if (record.some((cell) => cell !== '')) rows.push({ row, cells: record });
        return null;
      },
    });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    return { ok: false, row: 0, reason: spoken(error) };
  }
  if (trouble) return { ok: false, ...(trouble as { row: number; reason: string }), row: 0 };
  const [header, ...records] = rows;
  if (!header) return { ok: false, row: 0, reason: 'The file has no header line and no rows.' };
  if (records.length > mostRows) {
    return {
      ok: false,
      row: 0,
      reason: `The file has more than ${mostRows} rows: split it into several logs.`,
    };
  }
  return { ok: true, headers: header.cells, records };
}

function spoken({ code, message }: CsvError): string {
  if (code === 'CSV_MAX_RECORD_SIZE') {
    return 'A row is longer than 64 kB: look for a quotation mark that is never closed, or for lines that were joined.';
  }
  if (code === 'CSV_QUOTE_NOT_CLOSED') {
    return 'A quotation mark is opened and never closed: close it or remove it.';
  }
  return `The table cannot be split into rows (${message}): save it again as CSV.`;
}

function count(text: string, character: string): number {
  let found = 0;
  for (let at = text.indexOf(character); at >= 0; at = text.indexOf(character, at + 1)) found++;
  return found;
}
