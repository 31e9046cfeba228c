import type { Outcome } from '../schemas/trial.ts';

const words = new Map<string, Outcome>();
for (const [outcome, list] of [
  ['held', 'held hold holds ok o.k. pass passed good stuck stayed gripped no-slip no_slip noslip'],
  ['slipped', 'slipped slip slips slid slide crept creep moved fail failed nok n.o.k. bad'],
  ['lost', 'lost lose dropped fell ejected thrown flew released off'],
] as const) {
  for (const word of list.split(' ')) words.set(word, outcome);
}
for (const [phrase, outcome] of [
  ['no slip', 'held'],
  ['not slipped', 'held'],
  ['did not slip', 'held'],
  ['not ok', 'slipped'],
  ['part lost', 'lost'],
  ['lost part', 'lost'],
  ['fell off', 'lost'],
  ['flew off', 'lost'],
  ['thrown off', 'lost'],
  ['came off', 'lost'],
] as const) {
  words.set(phrase, outcome);
}

const yes = new Set(['1', 'yes', 'y', 'true', 'x']);
const no = new Set(['0', 'no', 'n', 'false']);

/** Column names that say what a yes means. */
const yesMeansSlipped = new Set([
  'slipped',
  'slip',
  'slipped?',
  'slip?',
  'failed',
  'fail',
  'failure',
]);
const yesMeansHeld = new Set(['held', 'held?', 'passed', 'pass', 'ok', 'ok?']);

export type ParsedOutcome =
  { ok: true; word: string; outcome: Outcome } | { ok: false; reason: string };

/**
 * Outcome of a trial from the log's own word, whatever its case. A bare yes or no (1, 0, true …)
 * has a meaning only under a column such as “slipped” or “held”, or by the mapping.
 *
 * @param given - the mapping's words, lower case
 * @param columnName - header of the column without unit, lower case
 */
export function parseOutcome(
  written: string,
  given: ReadonlyMap<string, Outcome>,
  columnName: string,
): ParsedOutcome {
  const word = written.trim().replace(/\s+/g, ' ').toLowerCase();
  if (word === '') return refuse('is empty: write held, slipped or lost');
  const known = given.get(word) ?? words.get(word);
  if (known) return { ok: true, word, outcome: known };
  if (yes.has(word) || no.has(word)) {
    const meansSlipped = yesMeansSlipped.has(columnName);
    if (!meansSlipped && !yesMeansHeld.has(columnName)) {
      return refuse('may mean held or slipped: say which, or call the column “slipped”');
    }
    return { ok: true, word, outcome: yes.has(word) === meansSlipped ? 'slipped' : 'held' };
  }
  return refuse('is not an outcome known here: say whether it means held, slipped or lost');
}

function refuse(reason: string): ParsedOutcome {
  return { ok: false, reason };
}
