import type { AccelerationUnit } from '../../shared/units/acceleration.ts';
import { fromRadPerS2 } from '../../shared/units/acceleration.ts';
import { fromRadians } from '../../shared/units/angle.ts';
import { fromMillimetres, type LengthUnit } from '../../shared/units/length.ts';
import type { Judgement, Outcome } from '../../shared/schemas/trial.ts';
import type { DemoTrial } from './runTrials.ts';

/** How a bench, or the person at it, writes its logs. */
export type Dialect = {
  delimiter: ',' | ';' | '\t';
  decimal: '.' | ',';
  position: { header: string; unit: LengthUnit };
  acceleration: { header: string; unit: AccelerationUnit };
  outcome: { header: string; words: Record<Outcome, string> };
  /** Header of the measured slip, in degrees. */
  slip?: string;
  run?: string;
  time?: string;
  seating?: string;
  batch?: string;
  judged?: string;
};

type Cell = string | number | null;

/** The text of a log in a dialect; columns without a header are left out. */
export function writeLog(
  trials: readonly DemoTrial[],
  judgedBy: Judgement,
  dialect: Dialect,
): string {
  const columns: [string | undefined, (trial: DemoTrial) => Cell][] = [
    [dialect.run, ({ order }) => order],
    [dialect.time, ({ at }) => at.replace('.000Z', 'Z')],
    [
      dialect.position.header,
      ({ positionMm }) => rounded(fromMillimetres(positionMm, dialect.position.unit), 4),
    ],
    [
      dialect.acceleration.header,
      ({ acceleration }) => rounded(fromRadPerS2(acceleration, dialect.acceleration.unit), 6),
    ],
    [dialect.outcome.header, ({ outcome }) => dialect.outcome.words[outcome]],
    [
      dialect.slip,
      ({ slipAngle }) => (slipAngle === null ? null : rounded(fromRadians(slipAngle), 2)),
    ],
    [dialect.judged, () => judgedBy],
    [dialect.seating, ({ seating }) => seating],
    [dialect.batch, ({ batch }) => batch],
  ];
  const used = columns.filter(([header]) => header !== undefined);
  const lines = [
    used.map(([header]) => written(header ?? '', dialect)),
    ...trials.map((trial) => used.map(([, cell]) => written(cell(trial), dialect))),
  ];
  return `${lines.map((cells) => cells.join(dialect.delimiter)).join('\n')}\n`;
}

function written(cell: Cell, { delimiter, decimal }: Dialect): string {
  if (cell === null) return '';
  const text = typeof cell === 'number' ? String(cell).replace('.', decimal) : cell;
  return text.includes(delimiter) || text.includes('"') ? `"${text.replaceAll('"', '""')}"` : text;
}

function rounded(value: number, decimals: number): number {
  return Math.round(value * 10 ** decimals) / 10 ** decimals;
}
