import type { LogProblem } from '../schemas/trialLog.ts';
import { formatQuantity } from '../units/formatQuantity.ts';
import type { LogRow } from './readRow.ts';

/** Held this far above the middle of a configuration's slips is more likely a slip of the pen. */
const farAbove = 1.25;

/** With fewer slips their middle says little. */
const enoughSlips = 3;

/** Holds before the slip that make a rising run look like one seated part stepped up. */
const stepsBeforeSlip = 4;

/**
 * Rows that are stored but deserve a second look: accelerations the drive cannot reach, holds far
 * above the slips of the same configuration, and rising runs that look like one seated part
 * stepped up until it slipped, when no seating or series says so.
 *
 * @param rows - in the order of the log
 * @param maxAcceleration - of the drive, rad/s²; null = unknown
 */
export function findOddities(
  rows: readonly LogRow[],
  maxAcceleration: number | null,
): LogProblem[] {
  return [
    ...beyondDrive(rows, maxAcceleration),
    ...heldFarAboveSlips(rows),
    ...steppedUp(rows),
  ].sort((a, b) => a.row - b.row);
}

function beyondDrive(rows: readonly LogRow[], maxAcceleration: number | null): LogProblem[] {
  if (maxAcceleration === null) return [];
  return rows
    .filter(({ acceleration }) => acceleration > maxAcceleration * (1 + 1e-9))
    .map((row) =>
      oddity(
        row,
        `${shown(row.acceleration)} is beyond what the drive can do (${shown(maxAcceleration)}): check the unit and the drive's limit.`,
      ),
    );
}

function heldFarAboveSlips(rows: readonly LogRow[]): LogProblem[] {
  const middles = new Map<string, number>();
  for (const [configuration, own] of byConfiguration(rows)) {
    const slips = own
      .filter(({ outcome }) => outcome !== 'held')
      .map(({ acceleration }) => acceleration)
      .sort((a, b) => a - b);
    if (slips.length >= enoughSlips) {
      middles.set(configuration, slips[Math.floor((slips.length - 1) / 2)]);
    }
  }
  return rows
    .filter(({ outcome, acceleration, configuration }) => {
      return (
        outcome === 'held' && acceleration > farAbove * (middles.get(configuration) ?? Infinity)
      );
    })
    .map((row) =>
      oddity(
        row,
        `Held at ${shown(row.acceleration)}, far above the slips of ${row.configuration} (half of them at or below ${shown(middles.get(row.configuration) ?? 0)}): check the outcome.`,
      ),
    );
}

function steppedUp(rows: readonly LogRow[]): LogProblem[] {
  const found: LogProblem[] = [];
  let run: LogRow[] = [];
  for (const row of rows) {
    const last = run.at(-1);
    const goesOn =
      last?.outcome === 'held' &&
      last.configuration === row.configuration &&
      row.acceleration > last.acceleration;
    run = goesOn ? [...run.slice(-stepsBeforeSlip), row] : [row];
    const told = run.some(({ seating, series }) => seating !== null || series !== null);
    if (row.outcome !== 'held' && run.length > stepsBeforeSlip && !told) {
      found.push(
        oddity(
          row,
          'This slip ends a rising run of holds: if one seated part was stepped up, give those rows a common series (or seating), for together they are one observation.',
        ),
      );
    }
  }
  return found;
}

function byConfiguration(rows: readonly LogRow[]): Map<string, LogRow[]> {
  const groups = new Map<string, LogRow[]>();
  for (const row of rows) {
    const group = groups.get(row.configuration);
    if (group) group.push(row);
    else groups.set(row.configuration, [row]);
  }
  return groups;
}

function oddity(row: LogRow, reason: string): LogProblem {
  return { row: row.row, column: null, value: null, reason };
}

function shown(acceleration: number): string {
  return `${formatQuantity(acceleration)} rad/s²`;
}
