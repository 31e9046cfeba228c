import type { LogField, LogMapping, LogProblem } from '../schemas/trialLog.ts';
import type { Judgement, Outcome } from '../schemas/trial.ts';
import { toRadPerS2 } from '../units/acceleration.ts';
import { toRadians } from '../units/angle.ts';
import { toMillimetres } from '../units/length.ts';
import {
  matchConfiguration,
  sameLabel,
  type KnownConfiguration,
  type SlideRange,
} from './matchConfiguration.ts';
import { parseJudgement } from './parseJudgement.ts';
import { parseNumber, type Decimal } from './parseNumber.ts';
import { parseOutcome } from './parseOutcome.ts';
import { parseTime } from './parseTime.ts';
import type { LogRecord } from './readRecords.ts';
import { spoken, type Columns } from './recogniseColumns.ts';
import type { TemperatureUnit } from './recogniseUnit.ts';

/** A trial as read from a log: SI, positions in mm; null for what the log does not say. */
export type LogRow = {
  row: number;
  /** Label of the configuration. */
  configuration: string;
  /** null for a configuration that this log proposes. */
  configurationId: number | null;
  positionMm: number;
  /** rad/s² */
  acceleration: number;
  outcome: Outcome;
  judgedBy: Judgement | null;
  /** rad */
  slipAngle: number | null;
  order: number | null;
  /** ISO 8601 UTC */
  at: string | null;
  direction: string | null;
  part: string | null;
  seating: string | null;
  series: string | null;
  batch: string | null;
  /** °C */
  temperature: number | null;
  remark: string | null;
};

/** How the cells of a log are to be understood. */
export type RowSettings = {
  columns: Columns;
  /** Number of headers. */
  width: number;
  decimal: Decimal;
  units: LogMapping['units'];
  temperatureUnit: TemperatureUnit;
  outcomes: ReadonlyMap<string, Outcome>;
  judgedBy: Judgement | null;
  known: readonly KnownConfiguration[];
  /** Grows by the configurations the log proposes. */
  added: KnownConfiguration[];
  slide: SlideRange | null;
  addConfigurations: boolean;
};

export type ReadRow =
  { ok: true; row: LogRow; word: string; notes: LogProblem[] } | { ok: false; problem: LogProblem };

/** Thrown inside a row to leave it; caught by `readRow` alone. */
class Refusal extends Error {
  constructor(
    readonly field: LogField | null,
    readonly value: string | null,
    message: string,
  ) {
    super(message);
  }
}

const longestWord = 60;
const longestRemark = 5000;

/** Understands one row, or says why not and how to mend it. */
export function readRow(record: LogRecord, settings: RowSettings): ReadRow {
  try {
    return understand(record, settings);
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const column = error.field && (settings.columns.get(error.field)?.header ?? null);
    return {
      ok: false,
      problem: { row: record.row, column, value: error.value, reason: error.message },
    };
  }
}

function understand(record: LogRecord, settings: RowSettings): ReadRow {
  const { columns, decimal, units } = settings;
  const notes: LogProblem[] = [];
  const cell = (field: LogField): string => {
    const column = columns.get(field);
    return column ? (record.cells[column.index] ?? '').trim() : '';
  };
  const refuse = (field: LogField, reason: string): never => {
    const value = cell(field);
    throw new Refusal(
      field,
      value.slice(0, 200),
      `The ${spoken(field)}${quoted(value)} ${reason}.`,
    );
  };
  const note = (field: LogField, reason: string): void => {
    notes.push({
      row: record.row,
      column: columns.get(field)?.header ?? null,
      value: cell(field).slice(0, 200),
      reason,
    });
  };
  const number = (field: LogField): number => {
    const parsed = parseNumber(cell(field), decimal);
    return parsed.ok ? parsed.value : refuse(field, parsed.reason);
  };
  const optionalNumber = (field: LogField): number | null =>
    cell(field) === '' ? null : number(field);
  const word = (field: LogField): string | null => {
    const text = oneLine(cell(field));
    if (text.length > longestWord)
      refuse(field, `is longer than ${longestWord} characters: shorten it`);
    return text === '' ? null : text;
  };

  checkWidth(record, settings.width);
  const acceleration = toRadPerS2(number('acceleration'), units.acceleration);
  if (!(acceleration > 0)) {
    refuse(
      'acceleration',
      'must be above 0: write its size, and the sense of rotation in a column of its own',
    );
  }
  if (!(acceleration <= 1e12)) refuse('acceleration', 'is beyond any drive: check the unit');
  const outcome = parseOutcome(
    cell('outcome'),
    settings.outcomes,
    columns.get('outcome')?.name ?? '',
  );
  if (!outcome.ok) return refuse('outcome', outcome.reason);

  const slip = optionalNumber('slipAngle');
  if (slip !== null && slip < 0) refuse('slipAngle', 'must be 0 or more: write its size');
  const at = cell('time') === '' ? null : parseTime(cell('time'));
  if (cell('time') !== '' && at === null) {
    note('time', 'The time is not understood and was left out: write it as 2026-03-14 10:22.');
  }
  const judged = cell('judgedBy') === '' ? null : parseJudgement(cell('judgedBy'));
  if (cell('judgedBy') !== '' && judged === null) {
    note(
      'judgedBy',
      'The way of judging is not understood and was left out: write peak lag, end mark or by eye.',
    );
  }
  const temperature = optionalNumber('temperature');
  const optional = {
    judgedBy: judged ?? (cell('judgedBy') === '' ? settings.judgedBy : null),
    slipAngle: slip === null ? null : toRadians(slip, units.slipAngle),
    order: optionalNumber('order'),
    at,
    direction: word('direction'),
    part: word('part'),
    seating: word('seating'),
    series: word('series'),
    batch: word('batch'),
    temperature: temperature === null ? null : toCelsius(temperature, settings.temperatureUnit),
    remark: oneLine(cell('remark')).slice(0, longestRemark) || null,
  };

  // last, so that a refused row proposes no configuration
  const named = knownLabel(cell('position'), settings.known);
  const label = word('configuration') ?? named;
  const positionMm =
    cell('position') === '' || named !== null
      ? null
      : toMillimetres(number('position'), units.position);
  if (label === null && positionMm === null) {
    const field = columns.has('position') ? 'position' : 'configuration';
    refuse(field, 'is empty: say where the masses stood');
  }
  const match = matchConfiguration({ label, positionMm }, settings.known, settings.added, {
    slide: settings.slide,
    add: settings.addConfigurations,
  });
  if (!match.ok) return refuse(match.column, match.reason);
  if (match.note) note('configuration', match.note);

  const { configuration } = match;
  return {
    ok: true,
    word: outcome.word,
    notes,
    row: {
      row: record.row,
      configuration: configuration.label,
      configurationId: configuration.id,
      positionMm: configuration.positionMm,
      acceleration,
      outcome: outcome.outcome,
      ...optional,
    },
  };
}

/** A position column may hold the labels of configurations, such as “70 mm” or “inner”. */
function knownLabel(text: string, known: readonly KnownConfiguration[]): string | null {
  if (text === '' || /^[0-9.,+-]+$/.test(text)) return null;
  return known.find(({ label }) => sameLabel(label, text))?.label ?? null;
}

/** A row with more cells than headers has slipped sideways, often by a decimal comma. */
function checkWidth({ row, cells }: LogRecord, width: number): void {
  const surplus = cells.slice(width).filter((text) => text.trim() !== '');
  if (surplus.length > 0) {
    throw new Refusal(
      null,
      surplus.join(' ').slice(0, 200),
      `Line ${row} has more cells than the header: look for a decimal comma or a separator inside a text, and put that text in quotation marks.`,
    );
  }
}

function quoted(value: string): string {
  return value === '' ? '' : ` “${value.length > 40 ? `${value.slice(0, 40)}…` : value}”`;
}

/** Line breaks and control characters become blanks; marks that turn the reading order go. */
function oneLine(text: string): string {
  return text
    .replace(/[\u202A-\u202E\u2066-\u2069]/g, '')
    .replace(/\p{Cc}+/gu, ' ')
    .trim();
}

function toCelsius(value: number, unit: TemperatureUnit): number {
  if (unit === 'K') return value - 273.15;
  return unit === '°F' ? ((value - 32) * 5) / 9 : value;
}
