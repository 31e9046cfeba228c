import { inertiaAt } from '../../../shared/physics/inertiaPolynomial.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';

type InertiaCurveProps = {
  polynomial: readonly number[];
  slide: { minMm: number; maxMm: number };
  marks: readonly { label: string; positionMm: number; inertia: number | null }[];
};

const width = 480;
const height = 200;
const left = 64;
const bottom = 34;
const steps = 48;

/** A small drawing of I(x) from zero up; the numbers stand in the table beside it. */
export function InertiaCurve({ polynomial, slide, marks }: InertiaCurveProps) {
  const span = slide.maxMm - slide.minMm;
  const points = Array.from({ length: steps + 1 }, (_, i) => {
    const position = slide.minMm + (span * i) / steps;
    return { position, inertia: inertiaAt(polynomial, position) };
  });
  const shown = marks.filter(({ inertia }) => inertia !== null);
  const most =
    Math.max(...points.map((p) => p.inertia), ...shown.map((m) => m.inertia ?? 0)) * 1.1 || 1;
  const x = (position: number) => left + ((position - slide.minMm) / span) * (width - left - 12);
  const y = (inertia: number) => 8 + (1 - inertia / most) * (height - bottom - 8);
  const path = points
    .map(
      ({ position, inertia }, i) =>
        `${i === 0 ? 'M' : 'L'}${x(position).toFixed(1)} ${y(inertia).toFixed(1)}`,
    )
    .join('');
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={`Moment of inertia over the position, from ${formatQuantity(points[0]?.inertia)} to ${formatQuantity(points.at(-1)?.inertia)} kg·m²`}
      className="w-full text-ink"
    >
      <path
        d={`M${left} 8V${height - bottom}H${width - 12}`}
        className="fill-none stroke-control"
      />
      <path d={path} className="fill-none stroke-ink" strokeWidth="2" />
      {shown.map(({ label, positionMm, inertia }) => (
        <circle key={label} cx={x(positionMm)} cy={y(inertia ?? 0)} r="4" className="fill-accent">
          <title>{label}</title>
        </circle>
      ))}
      <g className="fill-current text-[11px]">
        <text x={left - 6} y={16} textAnchor="end">
          {formatQuantity(most)}
        </text>
        <text x={left - 6} y={height - bottom + 4} textAnchor="end">
          0
        </text>
        <text x={left} y={height - 16}>
          {slide.minMm}
        </text>
        <text x={width - 12} y={height - 16} textAnchor="end">
          {slide.maxMm}
        </text>
        <text x={(width + left) / 2} y={height - 4} textAnchor="middle">
          position, mm
        </text>
        <text x={12} y={height / 2} textAnchor="middle" transform={`rotate(-90 12 ${height / 2})`}>
          inertia, kg·m²
        </text>
      </g>
    </svg>
  );
}
