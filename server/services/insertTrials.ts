import type { EntityManager } from 'typeorm';
import type { LogRow } from '../../shared/intake/readRow.ts';

const columns = [
  'fixture_id',
  'log_id',
  'configuration_id',
  'log_row',
  'acceleration',
  'outcome',
  'judged_by',
  'slip_angle',
  'run_order',
  'at',
  'direction',
  'part',
  'seating',
  'series',
  'batch',
  'temperature',
  'remark',
];
/** Rows of one statement: far below the packet limit, far above the cost of a round trip. */
const rowsAtOnce = 1000;

/** Inserts the trials of a log with multi-row statements, every value as a parameter. */
export async function insertTrials(
  manager: EntityManager,
  log: { fixtureId: number; logId: number; rows: LogRow[]; added: Map<string, number> },
): Promise<void> {
  for (let start = 0; start < log.rows.length; start += rowsAtOnce) {
    const rows = log.rows.slice(start, start + rowsAtOnce);
    const places = rows.map(() => `(${columns.map(() => '?').join(', ')})`).join(', ');
    const values = rows.flatMap((row) => [
      log.fixtureId,
      log.logId,
      row.configurationId ?? log.added.get(row.configuration),
      row.row,
      row.acceleration,
      row.outcome,
      row.judgedBy,
      row.slipAngle,
      row.order,
      row.at === null ? null : new Date(row.at),
      row.direction,
      row.part,
      row.seating,
      row.series,
      row.batch,
      row.temperature,
      row.remark,
    ]);
    await manager.query(`INSERT INTO trial (${columns.join(', ')}) VALUES ${places}`, values);
  }
}
