import type { FrictionSummary } from '../../../shared/schemas/frictionTest.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';

type GripFiguresProps = {
  kinetic: FrictionSummary | null;
  still: FrictionSummary | null;
  /** N·m per unit of μ; null when the seat's torque cannot be had. */
  torquePerMu: number | null;
};

/** The seat's friction and the torque that follows. */
export function GripFigures({ kinetic, still, torquePerMu }: GripFiguresProps) {
  return (
    <dl className="grid gap-4 sm:grid-cols-3">
      <Figure name="Kinetic μ" summary={kinetic} torquePerMu={torquePerMu} bound="holds up to" />
      <Figure name="Static μ" summary={still} torquePerMu={torquePerMu} bound="lets go at" />
      <div>
        <dt className="text-sm text-muted">Torque per unit of μ</dt>
        <dd className="text-2xl font-bold">
          {formatQuantity(torquePerMu)} <span className="text-base font-normal">N·m</span>
        </dd>
        <dd className="text-sm text-muted">
          normal force × effective radius, all faces that carry torque
        </dd>
      </div>
    </dl>
  );
}

type FigureProps = {
  name: string;
  summary: FrictionSummary | null;
  torquePerMu: number | null;
  bound: string;
};

function Figure({ name, summary, torquePerMu, bound }: FigureProps) {
  return (
    <div>
      <dt className="text-sm text-muted">{name}</dt>
      <dd className="text-2xl font-bold">{formatQuantity(summary?.mean)}</dd>
      <dd className="text-sm text-muted">
        {summary === null
          ? 'not tested yet'
          : `${scatterWords(summary)}${torqueWords(summary.mean, torquePerMu, bound)}`}
      </dd>
    </div>
  );
}

function scatterWords({ sd, n, uncertainty }: FrictionSummary): string {
  const digits = { digits: 2 };
  return `s ${formatQuantity(sd, digits)}, n ${n}, u ${formatQuantity(uncertainty, digits)}`;
}

function torqueWords(mu: number, torquePerMu: number | null, bound: string): string {
  return torquePerMu === null ? '' : ` · ${bound} ${formatQuantity(mu * torquePerMu)} N·m`;
}
