import { logFields, type LogField, type LogMappingInput } from '../schemas/trialLog.ts';
import { readHeader } from './readHeader.ts';
import { angleUnitOf } from './recogniseUnit.ts';

/** A column that was given a meaning. */
type Column = { index: number; header: string; name: string; unit: string | null };

export type Columns = Map<LogField, Column>;

/** Trouble that keeps every row from being read. */
export type ColumnTrouble = { column: string | null; reason: string };

/**
 * Gives the columns of a log their meaning: what the mapping says first (an empty name means the
 * log has no such column), the rest by the headers' words. Two columns that both look like the
 * position, the acceleration or the outcome are asked about; of other meanings the surer word
 * wins, whatever the order of the columns.
 */
export function recogniseColumns(
  headers: readonly string[],
  given: LogMappingInput['columns'],
): { columns: Columns; troubles: ColumnTrouble[] } {
  const troubles: ColumnTrouble[] = duplicates(headers);
  const columns: Columns = new Map();
  const taken = new Set<number>();
  const settled = new Set<LogField>();

  for (const field of logFields) {
    const header = given?.[field];
    if (header === undefined) continue;
    settled.add(field);
    if (header.trim() === '') continue;
    const index = headers.indexOf(header.trim());
    if (index < 0) {
      troubles.push({
        column: header,
        reason: `The log has no column “${header}” for the ${spoken(field)}: choose one of its headers.`,
      });
    } else if (taken.has(index)) {
      troubles.push({
        column: header,
        reason: `Column “${header}” was chosen for two meanings: choose another for the ${spoken(field)}.`,
      });
    } else {
      taken.add(index);
      columns.set(field, { index, header: header.trim(), ...unitAndName(header) });
    }
  }

  const candidates = new Map<LogField, (Column & { rank: number })[]>();
  for (const [index, header] of headers.entries()) {
    if (taken.has(index)) continue;
    const { name, unit, meaning } = readHeader(header);
    if (!meaning) continue;
    const field = fieldOf(meaning.field, unit);
    if (settled.has(field)) continue;
    const list = candidates.get(field) ?? [];
    list.push({ index, header, name, unit, rank: meaning.rank });
    candidates.set(field, list);
  }
  for (const [field, list] of candidates) {
    list.sort((a, b) => a.rank - b.rank || (a.header < b.header ? -1 : 1));
    const [best, second] = list;
    if (second && asked.has(field)) {
      troubles.push({
        column: second.header,
        reason: `Both “${best.header}” and “${second.header}” look like the ${spoken(field)}: choose one.`,
      });
    }
    columns.set(field, best);
  }
  return { columns, troubles };
}

const asked = new Set<LogField>(['position', 'acceleration', 'outcome']);

/** A slip in degrees or radians is how far it slipped, not whether. */
function fieldOf(field: LogField, unit: string | null): LogField {
  return field === 'outcome' && unit !== null && angleUnitOf(unit) ? 'slipAngle' : field;
}

/** A field's name in a sentence. */
export function spoken(field: LogField): string {
  if (field === 'slipAngle') return 'slip angle';
  return field === 'judgedBy' ? 'way of judging' : field;
}

function duplicates(headers: readonly string[]): ColumnTrouble[] {
  const seen = new Set<string>();
  const twice = new Set<string>();
  for (const header of headers) {
    if (header !== '' && seen.has(header)) twice.add(header);
    seen.add(header);
  }
  return [...twice].map((header) => ({
    column: header,
    reason: `Two columns are called “${header}”: rename one, so that it is clear which is meant.`,
  }));
}

function unitAndName(header: string): { name: string; unit: string | null } {
  const { name, unit } = readHeader(header);
  return { name, unit };
}
