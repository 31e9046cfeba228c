import type { FaceGeometry } from '../schemas/fixture.ts';
import { requirePositive } from './requireRange.ts';

/**
 * Radius at which a face's friction force acts when it turns about the axis: torque = μ N r.
 * Ring R; small pads their circle; disc ⅔R (uniform pressure) or ½R (uniform wear); annulus
 * ⅔(Ro³ − Ri³)/(Ro² − Ri²) or ½(Ro + Ri).
 *
 * @param geometry - radii in mm, > 0
 * @returns m
 * @throws RangeError if a radius is out of range
 * @source Shigley, Mechanical Engineering Design, ch. 16 (from memory)
 */
export function effectiveRadius(geometry: FaceGeometry): number {
  switch (geometry.kind) {
    case 'ring':
    case 'pads':
      return metres('radiusMm', geometry.radiusMm);
    case 'disc': {
      const radius = metres('radiusMm', geometry.radiusMm);
      return geometry.pressureLaw === 'uniform pressure' ? (2 * radius) / 3 : radius / 2;
    }
    case 'annulus': {
      const outer = metres('outerRadiusMm', geometry.outerRadiusMm);
      const inner = metres('innerRadiusMm', geometry.innerRadiusMm);
      if (inner >= outer) throw new RangeError('innerRadiusMm must be below outerRadiusMm');
      return geometry.pressureLaw === 'uniform pressure'
        ? // (Ro³ − Ri³)/(Ro² − Ri²) without the cancellation of nearly equal radii
          ((2 / 3) * (outer ** 2 + outer * inner + inner ** 2)) / (outer + inner)
        : (outer + inner) / 2;
    }
  }
}

function metres(name: string, mm: number): number {
  requirePositive(name, mm);
  return mm / 1000;
}
