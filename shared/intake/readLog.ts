import type { LogField, LogMapping, LogMappingInput, LogProblem } from '../schemas/trialLog.ts';
import type { Outcome } from '../schemas/trial.ts';
import { decodeText, type Encoding } from './decodeText.ts';
import { detectDecimal } from './detectDecimal.ts';
import { findHeader, type HeaderPlace } from './findHeader.ts';
import { findOddities } from './findOddities.ts';
import type { KnownConfiguration, SlideRange } from './matchConfiguration.ts';
import { readRecords, type LogRecord } from './readRecords.ts';
import { readRow, type LogRow } from './readRow.ts';
import { recogniseColumns, type Columns, type ColumnTrouble } from './recogniseColumns.ts';
import { resolveUnits } from './resolveUnits.ts';

/** What the intake needs to know of the fixture. */
export type LogContext = {
  configurations: readonly KnownConfiguration[];
  /** null without a build-up: then no position is new. */
  slide: SlideRange | null;
  /** Of the drive, rad/s²; null = unknown. */
  maxAcceleration: number | null;
};

/** A log as it was understood. `rows.length + refused` is the number of its data rows. */
export type LogReading = {
  /** Why nothing of the file was read; `unsupported` when it is not text at all. */
  refusal: { unsupported: boolean; reason: string } | null;
  mapping: LogMapping;
  headers: string[];
  /** First data rows as written. */
  sample: string[][];
  rows: LogRow[];
  refused: number;
  /** Row 0 = the whole file: then every row is refused. */
  problems: LogProblem[];
  oddities: LogProblem[];
  newConfigurations: { label: string; positionMm: number }[];
};

const sampleRows = 8;

/**
 * Reads a trial log: bytes → text → table → rows of trials in SI. Pure; the same bytes, mapping
 * and context always give the same answer. Nothing is guessed in silence: what was recognised
 * stands in `mapping`, what was assumed in `oddities`, and every row that is not accepted has a
 * problem that names row, column, value and remedy.
 *
 * @param given - what the person said about the file; the rest is recognised from it
 */
export function readLog(
  bytes: Uint8Array,
  given: LogMappingInput,
  context: LogContext,
): LogReading {
  const decoded = decodeText(bytes);
  if (!decoded.ok) {
    return unread(given, 'utf-8', null, decoded.reason, decoded.unsupported);
  }
  const { text, encoding } = decoded;
  const place = findHeader(text, given);
  const table = readRecords(text.slice(place.offset), place.delimiter, place.line);
  if (!table.ok) return unread(given, encoding, place, table.reason, false);

  const { headers, records } = table;
  const { columns, troubles } = recogniseColumns(headers, given.columns);
  const { units, temperatureUnit, ...doubts } = resolveUnits(columns, given.units);
  const decimal = given.decimal ?? detectDecimal(numbersOf(records, columns), place.delimiter);
  const outcomes = new Map(
    Object.entries(given.outcomes ?? {}).map(([word, outcome]) => [word.toLowerCase(), outcome]),
  );

  const reading: LogReading = {
    refusal: null,
    mapping: {
      encoding,
      delimiter: place.delimiter,
      decimal,
      headerLine: place.line,
      columns: Object.fromEntries([...columns].map(([field, { header }]) => [field, header])),
      units,
      outcomes: Object.fromEntries(outcomes),
      judgedBy: given.judgedBy ?? null,
      addConfigurations: given.addConfigurations ?? false,
    },
    headers,
    sample: records.slice(0, sampleRows).map(({ cells }) => cells),
    rows: [],
    refused: 0,
    problems: [],
    oddities: encodingOddity(encoding),
    newConfigurations: [],
  };
  const whole = [...troubles, ...doubts.troubles, ...missing(columns, headers, records.length)];
  if (whole.length > 0) {
    reading.refused = records.length;
    reading.problems = whole.map((trouble) => ({ row: 0, value: null, ...trouble }));
    return reading;
  }

  const added: KnownConfiguration[] = [];
  const settings = {
    columns,
    width: headers.length,
    decimal,
    units,
    temperatureUnit,
    outcomes,
    judgedBy: given.judgedBy ?? null,
    known: context.configurations,
    added,
    slide: context.slide,
    addConfigurations: given.addConfigurations ?? false,
  };
  const words = new Map<string, Outcome>(outcomes);
  const notes: LogProblem[] = [];
  for (const record of records) {
    const read = readRow(record, settings);
    if (read.ok) {
      reading.rows.push(read.row);
      words.set(read.word, read.row.outcome);
      notes.push(...read.notes);
    } else {
      reading.refused++;
      reading.problems.push(read.problem);
    }
  }
  reading.mapping.outcomes = Object.fromEntries(words);
  reading.oddities.push(
    ...doubts.oddities,
    ...notes,
    ...findOddities(reading.rows, context.maxAcceleration),
  );
  reading.newConfigurations = added.map(({ label, positionMm }) => ({ label, positionMm }));
  return reading;
}

/** Columns without which no row can be a trial. */
function missing(columns: Columns, headers: readonly string[], rows: number): ColumnTrouble[] {
  const shown = headers
    .filter((header) => header !== '')
    .slice(0, 12)
    .join(', ');
  const troubles: ColumnTrouble[] = [];
  const ask = (what: string): void => {
    troubles.push({
      column: null,
      reason: `No column of this log looks like the ${what} (its headers: ${shown}): choose one.`,
    });
  };
  if (!columns.has('position') && !columns.has('configuration')) ask('position or configuration');
  if (!columns.has('acceleration')) ask('acceleration');
  if (!columns.has('outcome')) ask('outcome');
  if (rows === 0) {
    troubles.push({ column: null, reason: 'The log has a header but no rows below it.' });
  }
  return troubles;
}

function* numbersOf(records: readonly LogRecord[], columns: Columns): Generator<string> {
  const numeric: LogField[] = ['position', 'acceleration', 'slipAngle', 'order', 'temperature'];
  const indices = numeric.flatMap((field) => columns.get(field)?.index ?? []);
  for (const { cells } of records) {
    for (const index of indices) yield cells[index] ?? '';
  }
}

function encodingOddity(encoding: Encoding): LogProblem[] {
  if (encoding !== 'windows-1252') return [];
  return [
    {
      row: 0,
      column: null,
      value: null,
      reason:
        'The file is not UTF-8 and was read as Windows-1252: check accents and degree signs, or save it as CSV UTF-8.',
    },
  ];
}

function unread(
  given: LogMappingInput,
  encoding: Encoding,
  place: HeaderPlace | null,
  reason: string,
  unsupported: boolean,
): LogReading {
  return {
    refusal: { unsupported, reason },
    mapping: {
      encoding,
      delimiter: place?.delimiter ?? given.delimiter ?? ',',
      decimal: given.decimal ?? '.',
      headerLine: place?.line ?? 1,
      columns: {},
      units: {
        position: given.units?.position ?? 'mm',
        acceleration: given.units?.acceleration ?? 'rad/s²',
        slipAngle: given.units?.slipAngle ?? '°',
      },
      outcomes: {},
      judgedBy: given.judgedBy ?? null,
      addConfigurations: given.addConfigurations ?? false,
    },
    headers: [],
    sample: [],
    rows: [],
    refused: 0,
    problems: [{ row: 0, column: null, value: null, reason }],
    oddities: [],
    newConfigurations: [],
  };
}
