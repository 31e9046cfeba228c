import { type LogAnswer } from '../../../shared/schemas/trialLog.ts';

/** `1 trial`, `118 trials`. */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${count} ${count === 1 ? one : many}`;
}

/** What will happen, in one sentence: `118 rows will be stored, 4 refused, 2 look odd.` */
export function planWords({ log, oddities }: Pick<LogAnswer, 'log' | 'oddities'>): string {
  if (log.accepted === 0) {
    return log.refused === 0
      ? 'Nothing in this file can be stored.'
      : `No row can be stored: all ${log.refused} are refused.`;
  }
  const odd = new Set(oddities.filter(({ row }) => row > 0).map(({ row }) => row)).size;
  const parts = [`${counted(log.accepted, 'row')} will be stored`];
  if (log.refused > 0) parts.push(`${log.refused} refused`);
  if (odd > 0) parts.push(`${odd} ${odd === 1 ? 'looks' : 'look'} odd`);
  return `${parts.join(', ')}.`;
}
