import type { Trial } from '../../../shared/schemas/trial.ts';

/**
 * Trials in the order they were run. Run orders start again with every log, so logs follow each
 * other as they were stored; within a log the written order counts, else the row.
 *
 * @returns each trial with its place, from 1
 */
export function placeInOrder(trials: readonly Trial[]): { trial: Trial; order: number }[] {
  return [...trials]
    .sort((a, b) => a.logId - b.logId || (a.order ?? a.row) - (b.order ?? b.row) || a.row - b.row)
    .map((trial, index) => ({ trial, order: index + 1 }));
}
