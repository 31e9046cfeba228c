import type { Judgement } from '../schemas/trial.ts';

const words = new Map<string, Judgement>([
  ['peak lag', 'peak lag'],
  ['peak', 'peak lag'],
  ['lag', 'peak lag'],
  ['encoder', 'peak lag'],
  ['encoders', 'peak lag'],
  ['end mark', 'end mark'],
  ['mark', 'end mark'],
  ['final offset', 'end mark'],
  ['by eye', 'by eye'],
  ['eye', 'by eye'],
  ['visual', 'by eye'],
  ['camera', 'by eye'],
]);

/** How an outcome was judged, from the log's own word; null when it is not known here. */
export function parseJudgement(written: string): Judgement | null {
  return (
    words.get(
      written
        .trim()
        .replace(/[\s_-]+/g, ' ')
        .toLowerCase(),
    ) ?? null
  );
}
