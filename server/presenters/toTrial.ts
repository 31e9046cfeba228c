import type { Trial } from '../../shared/schemas/trial.ts';
import type { ConfigurationRow } from '../entities/ConfigurationRow.ts';
import type { TrialRow } from '../entities/TrialRow.ts';

export function toTrial(row: TrialRow, configuration: ConfigurationRow): Trial {
  return {
    id: row.id,
    fixtureId: row.fixtureId,
    logId: row.logId,
    version: row.version,
    row: row.row,
    configurationId: row.configurationId,
    configuration: configuration.label,
    positionMm: configuration.positionMm,
    acceleration: row.acceleration,
    outcome: row.outcome,
    judgedBy: row.judgedBy,
    slipAngle: row.slipAngle,
    order: row.order,
    at: row.at?.toISOString() ?? null,
    direction: row.direction,
    part: row.part,
    seating: row.seating,
    series: row.series,
    batch: row.batch,
    temperature: row.temperature,
    remark: row.remark,
    excluded: row.excluded,
    excludedReason: row.excludedReason,
    excludedBy: row.excludedBy,
    excludedAt: row.excludedAt?.toISOString() ?? null,
  };
}
