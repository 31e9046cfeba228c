import { describe, expect, it } from 'vitest';
import { endMark, kappaOfSlip, peakLag } from '../../../shared/physics/slipMotion.ts';
import { fromRadians } from '../../../shared/units/angle.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

/** Steps a triangular move with a slipping part: an independent look at the closed forms. */
function integrate(angle: number, kappa: number): { peak: number; end: number } {
  const steps = 200_000;
  const time = 2 * Math.sqrt(angle);
  const dt = time / steps;
  const table = { angle: 0, speed: 0 };
  const part = { angle: 0, speed: 0 };
  let peak = 0;
  for (let step = 0; step < 2 * steps; step++) {
    const accelerates = step < steps / 2;
    const moves = step < steps;
    const command = accelerates ? 1 : moves ? -1 : 0;
    const slip = table.speed - part.speed;
    const drag = Math.sign(slip) * kappa * dt;
    table.angle += table.speed * dt + (command * dt ** 2) / 2;
    table.speed = moves ? table.speed + command * dt : 0;
    part.angle += part.speed * dt;
    part.speed += drag;
    peak = Math.max(peak, table.angle - part.angle);
  }
  return { peak, end: table.angle - part.angle };
}

describe('what a slip looks like', () => {
  it('agrees with the table of the handbook at κ 0.6 over 180°', () => {
    expectCheckValue('slip.peak_lag_deg_k0.6', fromRadians(peakLag(Math.PI, 0.6)));
    expectCheckValue('slip.net_deg_k0.6', fromRadians(endMark(Math.PI, 0.6)));
  });

  it('leaves 0.12° of 4.6° of slip at κ 0.95', () => {
    expect(fromRadians(peakLag(Math.PI, 0.95))).toBeCloseTo(4.615, 3);
    expect(fromRadians(endMark(Math.PI, 0.95))).toBeCloseTo(0.1183, 4);
  });

  it('agrees with stepping the motion', () => {
    const { peak, end } = integrate(Math.PI, 0.7);
    expect(peak).toBeCloseTo(peakLag(Math.PI, 0.7), 3);
    expect(end).toBeCloseTo(endMark(Math.PI, 0.7), 3);
  });

  it('gives κ back from either measurement', () => {
    for (const kappa of [0.5, 0.9, 1]) {
      expect(kappaOfSlip(2, peakLag(2, kappa), 'peak lag')).toBeCloseTo(kappa, 12);
      expect(kappaOfSlip(2, endMark(2, kappa), 'end mark')).toBeCloseTo(kappa, 12);
    }
  });

  it('refuses a slip beyond the move and a κ beyond 1', () => {
    expect(() => kappaOfSlip(1, 1.1, 'peak lag')).toThrow(/^slip must not exceed/);
    expect(() => peakLag(1, 1.1)).toThrow(/^kappa must be/);
  });
});
