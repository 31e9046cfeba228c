import type { Face, Fixture } from '../../../shared/schemas/fixture.ts';
import { plainNumber } from '../../lib/plainNumber.ts';
import { formatDay } from '../../lib/formatDate.ts';

/** What was entered of a fixture, in words. */
export function FixtureFacts({ fixture }: { fixture: Fixture }) {
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1.5 text-sm">
      {factsOf(fixture).map(([name, value]) => (
        <div key={name} className="contents">
          <dt className="text-muted">{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function factsOf({
  status,
  move,
  drive,
  axis,
  hold,
  seat,
  remark,
  updatedAt,
}: Fixture): [string, string][] {
  const facts: [string, string | null][] = [
    ['Status', status],
    ['Move', `${plainNumber(move.angleDeg)}°, then ${plainNumber(move.dwell)} s at rest`],
    ['Axis', axis.tiltDeg === 0 ? 'vertical' : `${plainNumber(axis.tiltDeg)}° from the vertical`],
    ['Peak acceleration', `${plainNumber(drive.maxAcceleration)} rad/s²`],
    [
      'Peak speed',
      drive.maxSpeed === null ? 'never reached' : `${plainNumber(drive.maxSpeed)} rad/s`,
    ],
    ['Jerk limit', drive.maxJerk === null ? null : `${plainNumber(drive.maxJerk)} rad/s³`],
    ['Limits rounded to', `${plainNumber(drive.resolution)} rad/s²`],
    ['Mass on the seat', hold.mass === null ? 'from the build-up' : `${plainNumber(hold.mass)} kg`],
    ['Clamp', hold.clampForce === 0 ? null : `${plainNumber(hold.clampForce)} N`],
    ['Spring', hold.springForce === 0 ? null : `${plainNumber(hold.springForce)} N`],
    [
      'Vacuum',
      hold.vacuum === null
        ? null
        : `${plainNumber(hold.vacuum.pressureDifference / 1000)} kPa on ${plainNumber(hold.vacuum.sealedAreaMm2)} mm²`,
    ],
    [
      'Vertical acceleration',
      hold.verticalAcceleration === 0 ? null : `${plainNumber(hold.verticalAcceleration)} m/s²`,
    ],
    [
      'Centre of mass',
      hold.eccentricityMm === 0
        ? 'on the axis'
        : `${plainNumber(hold.eccentricityMm)} mm off the axis`,
    ],
    ...seat.faces.map((face): [string, string] => [face.name, faceWords(face)]),
    ['Remark', remark],
    ['Last change', formatDay(updatedAt)],
  ];
  return facts.filter((fact): fact is [string, string] => fact[1] !== null);
}

function faceWords({ geometry, pressedBy, torsionallyFixed }: Face): string {
  const pressed = `pressed by ${pressedBy.join(' and ')}`;
  const swivels = torsionallyFixed ? '' : ', swivels freely: carries no torque';
  switch (geometry.kind) {
    case 'ring':
      return `ring, radius ${geometry.radiusMm} mm, ${pressed}${swivels}`;
    case 'disc':
      return `disc, radius ${geometry.radiusMm} mm, ${geometry.pressureLaw}, ${pressed}${swivels}`;
    case 'annulus':
      return `annulus, ${geometry.innerRadiusMm} to ${geometry.outerRadiusMm} mm, ${geometry.pressureLaw}, ${pressed}${swivels}`;
    case 'pads':
      return `${geometry.count} pads on radius ${geometry.radiusMm} mm, ${pressed}${swivels}`;
  }
}
