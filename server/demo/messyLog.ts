import { fromRadPerS2 } from '../../shared/units/acceleration.ts';
import { fromRadians } from '../../shared/units/angle.ts';
import type { Outcome } from '../../shared/schemas/trial.ts';
import type { DayPlan } from './fixturePlan.ts';
import { frictionTests } from './frictionTests.ts';
import { benchPc } from './dialects.ts';
import { clackCarrier } from './plans/valveBodies.ts';
import { randomSource, type RandomSource } from './randomSource.ts';
import { runTrials, type DemoTrial } from './runTrials.ts';

const seed = 1351;

const others = ['25 mm', '50 mm', '100 mm'];
const days: DayPlan[] = [
  {
    day: '2026-11-24',
    levels: [0.8, 0.9, 0.97, 1.03, 1.09, 1.15, 1.22, 1.3],
    repeats: 2,
    only: others,
    dialect: benchPc,
  },
  {
    day: '2026-11-25',
    levels: [0.7, 0.76, 0.81, 0.86, 0.91, 0.97, 1.05],
    repeats: 3,
    only: ['75 mm'],
    dialect: benchPc,
  },
];

/** Three shifts, three ways of writing it down. */
const words: Record<Outcome, string[]> = {
  held: ['ok', 'Held', 'HELD', 'pass'],
  slipped: ['slip', 'Slipped', 'FAIL', 'moved'],
  lost: ['lost', 'Part lost', 'fell off'],
};

/** Rows that cannot be trials, and the index of the trial before which each stands. */
const badRows = new Map<number, string>([
  [4, ';5,0;n/a;ok;;encoder;drive tripped'],
  [11, ';7,5;3.105,5;slip;2,4;encoder;'],
  [19, ';6,1;4200,0;ok;;encoder;slide not at its stop'],
  [26, ';10,0;2310,5;;;encoder;nobody looked'],
  [33, ';13,5;1800,0;ok;;encoder;'],
  [40, ';2,5;5602.5;slip;1,9;encoder;'],
  [47, ';7,5;0;ok;;encoder;dry run'],
  [52, ';;;;;;'],
  [55, ';5,0;4710,5;so-so;;encoder;'],
]);

/** The finger slipped: ten times the acceleration, stored but asked about. */
const oddRow = '86;2,5;62430,0;lost;;encoder;';

/**
 * The log of a bad day: title block, semicolons, decimal commas, centimetres and degrees, three
 * ways to say held, rows that are no trials, Windows line ends and encoding. It belongs to the
 * demo fixture CC-3, is not among its logs, and shows what its first short series could not: one
 * position slips early, the others are in line.
 */
export function messyLog(): { fixtureCode: string; fileName: string; bytes: Uint8Array } {
  const plan = { ...clackCarrier, days };
  const tests = frictionTests(clackCarrier, randomSource(clackCarrier.seed));
  const random = randomSource(seed);
  const made = runTrials(plan, tests, random).flatMap((day) => day.trials);
  // both days' moves in one random order, after the sixteen of the first series
  const trials = random.shuffle(made).map((trial, index) => ({ ...trial, order: 17 + index }));
  const lines = [
    'Slip trials, check valve clacks (demo data, invented);;;;;;',
    'Bench 2;;24.11.2026 to 25.11.2026;;;;',
    'pads new in October, table wiped before each shift;;;;;;',
    ';;;;;;',
    'Run no.;Slide pos. [cm];Peak accel. [deg/s²];Result;Slip angle [°];Judged by;Remarks',
  ];
  for (const [index, trial] of trials.entries()) {
    const bad = badRows.get(index);
    if (bad !== undefined) lines.push(bad);
    lines.push(rowOf(trial, random));
  }
  lines.push(oddRow, `Total;${trials.length};;;;;`);
  return {
    fixtureCode: clackCarrier.fixture.code,
    fileName: 'messy-CC-3_2026-11-24.csv',
    bytes: latin(`${lines.join('\r\n')}\r\n`),
  };
}

function rowOf(trial: DemoTrial, random: RandomSource): string {
  const choices = words[trial.outcome];
  return [
    String(trial.order),
    comma(trial.positionMm / 10),
    comma(fromRadPerS2(trial.acceleration, 'deg/s²')),
    choices[Math.floor(random.uniform() * choices.length)],
    trial.slipAngle === null ? '' : comma(fromRadians(trial.slipAngle)),
    'encoder',
    '',
  ].join(';');
}

function comma(value: number): string {
  return value.toFixed(1).replace('.', ',');
}

/** All its characters are in ISO 8859-1, so each is one byte of Windows-1252. */
function latin(text: string): Uint8Array {
  return Uint8Array.from(text, (character) => character.charCodeAt(0));
}
