import type { Fixture } from '../../shared/schemas/fixture.ts';
import type { FixtureRow } from '../entities/FixtureRow.ts';

export function toFixture(row: FixtureRow): Fixture {
  const { axis, move, drive, seat, hold } = row.spec;
  return {
    id: row.id,
    version: row.version,
    code: row.code,
    name: row.name,
    line: row.line,
    status: row.status,
    remark: row.remark,
    axis,
    move,
    drive,
    seat,
    hold,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}
