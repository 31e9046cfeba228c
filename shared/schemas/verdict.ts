/** Verdicts from worst to best; a fixture's verdict is the worst of its configurations. */
export const verdicts = [
  'breached',
  'slips early',
  'early',
  'no common curve',
  'not shown',
  'undecided',
  'not checked',
  'holds longer',
  'late',
  'in line',
] as const;

export type Verdict = (typeof verdicts)[number];
