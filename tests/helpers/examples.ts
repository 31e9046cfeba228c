import type { BuildUpInput } from '../../shared/schemas/buildUp.ts';
import type { FixtureInput } from '../../shared/schemas/fixture.ts';
import type { FrictionTestInput } from '../../shared/schemas/frictionTest.ts';
import type { Client } from './server.ts';

/** A centred part on a ring seat, held by its weight and a clamp. */
export function exampleFixture(code = 'EX-1'): FixtureInput {
  return {
    code,
    name: 'Example turnover table',
    line: 'Line 1',
    status: 'in use',
    remark: null,
    axis: { tiltDeg: 0 },
    move: { angleDeg: 180, dwell: 1.2 },
    drive: { maxSpeed: 20, maxAcceleration: 200, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'ring seat',
          geometry: { kind: 'ring', radiusMm: 40 },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.01,
    },
    hold: {
      mass: null,
      verticalAcceleration: 0,
      clampForce: 20,
      springForce: 0,
      vacuum: null,
      eccentricityMm: 0,
    },
  };
}

export function exampleBuildUp(version: number): BuildUpInput {
  return {
    version,
    bodies: [
      {
        name: 'valve body',
        shape: { kind: 'solid cylinder, axial', radiusMm: 50 },
        mass: 2,
        count: 1,
        placement: 'fixed',
        offsetMm: 0,
      },
      {
        name: 'sliding mass',
        shape: { kind: 'solid cylinder, axial', radiusMm: 15 },
        mass: 0.4,
        count: 2,
        placement: 'slide',
        offsetMm: 0,
      },
    ],
    slide: { minMm: 0, maxMm: 150 },
    relativeUncertainty: 0.01,
    remark: null,
  };
}

export function exampleFrictionTest(kind: 'kinetic' | 'static'): FrictionTestInput {
  const base = kind === 'kinetic' ? 30 : 36;
  return {
    kind,
    face: null,
    surfaces: 'nitrile pad on bronze',
    batch: 'P1',
    testedOn: '2026-10-05',
    readings: [-1, 0, 1, 0.5, -0.5].map((d) => ({ heightMm: base + d, baseMm: 100 })),
    readingUncertainty: 0.002,
    remark: null,
  };
}

export const examplePositions = [20, 60, 100];

/** A fixture with build-up, three positions and both friction tests. @returns its id */
export async function enterExample(client: Client, code = 'EX-1'): Promise<number> {
  const created = await client.send('post', '/api/fixtures', exampleFixture(code)).expect(201);
  const { id, version } = created.body as { id: number; version: number };
  const at = `/api/fixtures/${id}`;
  await client.send('put', `${at}/build-up`, exampleBuildUp(version)).expect(200);
  for (const positionMm of examplePositions) {
    const body = { label: `${positionMm} mm`, positionMm, measuredInertia: null };
    await client.send('post', `${at}/configurations`, body).expect(201);
  }
  for (const kind of ['kinetic', 'static'] as const) {
    await client.send('post', `${at}/friction-tests`, exampleFrictionTest(kind)).expect(201);
  }
  return id;
}

/** A clean log of the example: held below 105 N·m-ish levels, slipped above, a few in between. */
export function exampleLog(rows = 8): string {
  const lines = ['position [mm],acceleration [rad/s²],outcome'];
  const half = new Map([
    [20, 210],
    [60, 92],
    [100, 44],
  ]);
  for (const [position, alpha50] of half) {
    for (let i = 0; i < rows; i += 1) {
      const alpha = alpha50 * (0.8 + (0.4 * i) / (rows - 1));
      const slipped = i >= rows / 2 ? i !== rows / 2 : i === rows / 2 - 1;
      lines.push(`${position},${alpha.toFixed(2)},${slipped ? 'slipped' : 'held'}`);
    }
  }
  return `${lines.join('\n')}\n`;
}
