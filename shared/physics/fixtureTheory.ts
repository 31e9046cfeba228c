import type { AnalysisRequest } from '../schemas/analysis.ts';
import type { BuildUp } from '../schemas/buildUp.ts';
import type { Configuration } from '../schemas/configuration.ts';
import type { FixtureInput } from '../schemas/fixture.ts';
import { toRadians } from '../units/angle.ts';
import { effectiveRadius } from './effectiveRadius.ts';
import { equivalentTorque } from './equivalentTorque.ts';
import {
  inertiaAt,
  inertiaPolynomial,
  totalMass,
  type InertiaPolynomial,
} from './inertiaPolynomial.ts';
import { normalForces, weightOnSeat, type Weight } from './normalForces.ts';
import { seatFriction, type FaceTest, type SeatFriction } from './seatFriction.ts';
import { seatCapacity, seatTorque, type LoadedFace, type SeatCapacity } from './seatTorque.ts';

/** What theory needs of a fixture, as entered or as stored. */
export type TheoryFixture = Pick<FixtureInput, 'axis' | 'move' | 'drive' | 'seat' | 'hold'>;

export type TheoryBuildUp = Pick<BuildUp, 'bodies' | 'relativeUncertainty'>;

export type TheoryConfiguration = Pick<Configuration, 'label' | 'positionMm' | 'measuredInertia'>;

type TorquePerMu = { value: number; relativeUncertainty: number };

/** One configuration as theory sees it; null where it cannot be had (see the notes). */
type ConfigurationTheory = {
  label: string;
  positionMm: number;
  /** kg·m² from the build-up. */
  computedInertia: number | null;
  /** kg·m² in force: measured, else computed. */
  inertia: number | null;
  /** Standard relative uncertainty of the inertia in force. */
  inertiaRelativeUncertainty: number;
  /** N·m per unit of μ, such that α_th = μ·T/I also for an off-centre part. */
  torquePerMu: TorquePerMu | null;
};

export type FixtureTheory = {
  polynomial: InertiaPolynomial | null;
  /** kg that turn with the part; null without a build-up. */
  totalMass: number | null;
  /** Σ N r of the faces that carry torque, N·m per unit of μ. */
  torquePerMu: number | null;
  /** Normal force of every face that carries torque. */
  faces: (LoadedFace & { name: string })[];
  configurations: ConfigurationTheory[];
  friction: NonNullable<AnalysisRequest['friction']>;
  /** rad */
  moveAngle: number;
  drive: { maxAcceleration: number; resolution: number };
  /** What could not be had, and why, in sentences. */
  notes: string[];
};

/**
 * Everything an analysis needs to know of a fixture beside its trials: inertia and torque per
 * unit of μ of every configuration, the friction of the seat, the move and the drive.
 *
 * Trouble in the data (no build-up, a face that lifts off, a part that slides at rest) never
 * throws: the quantity is null and a note says why. Friction of several faces with tests of their
 * own is combined with weights N r; degrees of freedom by Welch–Satterthwaite, rounded down.
 *
 * @param buildUp - current revision, or null
 * @param tests - all friction tests; excluded ones are left out here
 */
export function fixtureTheory(
  fixture: TheoryFixture,
  buildUp: TheoryBuildUp | null,
  configurations: readonly TheoryConfiguration[],
  tests: readonly FaceTest[],
): FixtureTheory {
  const notes: string[] = [];
  const polynomial = buildUp && inertiaPolynomial(buildUp.bodies);
  const mass = buildUp && totalMass(buildUp.bodies);
  if (!buildUp) notes.push('No build-up yet: inertia is known only where it was measured.');

  const { weight, faces } = loadedFaces(fixture, mass, notes);
  const kinetic = seatFriction(faces, tests, 'kinetic');
  const still = seatFriction(faces, tests, 'static');
  noteFriction(faces, tests, { kinetic, still }, notes);

  const perMu = faces.length > 0 ? seatTorque(faces) : null;
  const reference = referenceFriction(faces, perMu, kinetic ?? still);
  const move = { angle: toRadians(fixture.move.angleDeg), maxSpeed: fixture.drive.maxSpeed };
  const eccentricity = fixture.hold.eccentricityMm / 1000;
  if (eccentricity > 0 && mass === null) {
    notes.push('Off-centre mass is left out of theory: give the build-up, its mass is needed.');
  }

  let proportional = true;
  const torqueOf = (inertia: number | null): TorquePerMu | null => {
    const { relativeUncertainty } = fixture.seat;
    if (!perMu || perMu.torque === 0 || !reference) return null;
    const lateral = weight?.lateral ?? 0;
    const offCentre = (eccentricity > 0 && mass !== null) || lateral > 0;
    if (!offCentre) return { value: perMu.torque, relativeUncertainty };
    if (inertia === null) return null;
    const part = { mass: mass ?? 1, eccentricity: mass === null ? 0 : eccentricity };
    const found = equivalentTorque(inertia, reference.perMu, reference.mu, part, move, lateral);
    proportional &&= found.proportional;
    if (found.torquePerMu === 0) return null;
    return { value: found.torquePerMu, relativeUncertainty };
  };

  const rows = configurations.map(({ label, positionMm, measuredInertia }) => {
    const computed = polynomial ? inertiaAt(polynomial, positionMm) : null;
    const computedInertia = computed !== null && computed > 0 ? computed : null;
    const inertia = measuredInertia?.value ?? computedInertia;
    return {
      label,
      positionMm,
      computedInertia,
      inertia,
      inertiaRelativeUncertainty:
        measuredInertia?.relativeUncertainty ?? buildUp?.relativeUncertainty ?? 0,
      torquePerMu: torqueOf(inertia),
    };
  });
  if (!proportional) {
    notes.push(
      'The speed cap or the tilted axis keeps the theory limit from being proportional to μ: it is evaluated at the tested coefficient.',
    );
  }
  for (const row of rows) {
    if (row.inertia !== null && perMu && perMu.torque > 0 && !row.torquePerMu) {
      notes.push(`${row.label}: by theory the part slides at rest; check hold, tilt and friction.`);
    }
  }

  return {
    polynomial,
    totalMass: mass,
    torquePerMu: perMu && perMu.torque > 0 ? perMu.torque : null,
    faces,
    configurations: rows,
    friction: {
      ...(kinetic && { kinetic: kinetic.sample }),
      ...(still && { static: still.sample }),
    },
    moveAngle: move.angle,
    drive: {
      maxAcceleration: fixture.drive.maxAcceleration,
      resolution: fixture.drive.resolution,
    },
    notes,
  };
}

/** Faces that are torsionally fixed, with normal force and radius; none when it cannot be had. */
function loadedFaces(
  { axis, hold, seat }: TheoryFixture,
  buildUpMass: number | null,
  notes: string[],
): { weight: Weight | null; faces: (LoadedFace & { name: string })[] } {
  const fixed = seat.faces.filter((face) => face.torsionallyFixed);
  if (fixed.length === 0) notes.push('No face is torsionally fixed: the seat carries no torque.');
  const mass = hold.mass ?? buildUpMass;
  try {
    const weight =
      mass === null ? null : weightOnSeat(mass, hold.verticalAcceleration, axis.tiltDeg);
    const forces = normalForces(fixed, hold, weight);
    const faces = fixed.map((face, index) => ({
      name: face.name,
      normalForce: forces[index] ?? 0,
      radius: effectiveRadius(face.geometry),
    }));
    if (faces.length > 0 && forces.every((force) => force === 0)) {
      notes.push('Nothing presses the seat: give a weight, clamp, spring or vacuum.');
    }
    return { weight, faces };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    notes.push(`The torque of the seat cannot be had: ${error.message}.`);
    return { weight: null, faces: [] };
  }
}

/** Capacity per unit of the seat's mean μ; with one μ for all faces simply Σ N r and Σ N. */
function referenceFriction(
  faces: readonly LoadedFace[],
  perMu: SeatCapacity | null,
  friction: SeatFriction | null,
): { perMu: SeatCapacity; mu: number } | null {
  if (!perMu) return null;
  if (!friction) return { perMu, mu: 1 };
  const { torque, force } = seatCapacity(faces, friction.perFace);
  const mu = friction.sample.mean;
  return { perMu: { torque: torque / mu, force: force / mu }, mu };
}

function noteFriction(
  faces: readonly { name: string }[],
  tests: readonly FaceTest[],
  { kinetic, still }: { kinetic: SeatFriction | null; still: SeatFriction | null },
  notes: string[],
): void {
  const kept = tests.filter((test) => !test.excluded);
  if (!kinetic && !still && faces.length > 0) {
    notes.push(
      kept.length === 0
        ? 'No friction test yet: theory gives no limit.'
        : 'Some face that carries torque has no friction test: test it, or test for every face.',
    );
  }
  const names = new Set(faces.map(({ name }) => name));
  const strays = kept.flatMap(({ face }) => (face !== null && !names.has(face) ? [face] : []));
  for (const stray of new Set(strays)) {
    notes.push(`Friction tests of “${stray}” are not used: no face of that name carries torque.`);
  }
}
