import {
  type LogField,
  logFields,
  type LogMapping,
  type LogProblem,
} from '../../../shared/schemas/trialLog.ts';

type Columns = LogMapping['columns'];

/** What each meaning of a column is called on the screen. */
export const fieldTitles: Record<LogField, string> = {
  configuration: 'Configuration',
  position: 'Position',
  acceleration: 'Acceleration',
  outcome: 'Outcome',
  slipAngle: 'Slip angle',
  order: 'Run order',
  time: 'Time',
  direction: 'Direction',
  part: 'Part',
  seating: 'Seating',
  series: 'Step-up series',
  batch: 'Pad batch',
  temperature: 'Temperature, °C',
  judgedBy: 'How it was judged',
  remark: 'Remark',
};

/** The meaning a column has, null when it is not used. */
export function meaningOf(columns: Columns, header: string): LogField | null {
  const found = Object.entries(columns).find(([, name]) => name === header);
  return found === undefined ? null : (found[0] as LogField);
}

/** Gives a column a meaning (null: not used); the column that had the meaning before loses it. */
export function assignColumn(columns: Columns, header: string, meaning: LogField | null): Columns {
  const kept = Object.fromEntries(
    Object.entries(columns).filter(([field, name]) => name !== header && field !== meaning),
  ) as Columns;
  return meaning === null ? kept : { ...kept, [meaning]: header };
}

/** Words of the outcome column that were refused because nobody said what they mean. */
export function unknownOutcomeWords(
  mapping: LogMapping,
  problems: readonly LogProblem[],
): string[] {
  const column = mapping.columns.outcome;
  const known = new Set(Object.keys(mapping.outcomes));
  const words = problems.flatMap(({ column: at, value }) =>
    at === column && column !== undefined && value !== null && value.trim() !== ''
      ? [value.trim().toLowerCase()]
      : [],
  );
  return [...new Set(words)].filter((word) => !known.has(word));
}

/**
 * The whole answer to "which column is what": a meaning no column has is sent with an empty name,
 * which tells the intake not to look for it again.
 */
export function explicitColumns(columns: Columns): Record<LogField, string> {
  return Object.fromEntries(logFields.map((field) => [field, columns[field] ?? ''])) as Record<
    LogField,
    string
  >;
}
