import { inertiaPolynomial, totalMass } from '../../shared/physics/inertiaPolynomial.ts';
import type { BuildUp } from '../../shared/schemas/buildUp.ts';
import type { BuildUpRow } from '../entities/BuildUpRow.ts';

/** @param latest - the current revision's number */
export function toBuildUp(
  row: Omit<BuildUpRow, 'id'>,
  fixture: { version: number },
  latest: number,
): BuildUp {
  const { bodies, slide, relativeUncertainty, remark } = row.content;
  return {
    fixtureId: row.fixtureId,
    fixtureVersion: fixture.version,
    revision: row.revision,
    current: row.revision === latest,
    bodies,
    slide,
    relativeUncertainty,
    remark,
    totalMass: totalMass(bodies),
    polynomial: inertiaPolynomial(bodies),
    createdAt: row.createdAt.toISOString(),
    createdBy: row.createdBy,
  };
}
