import { createHash } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import type { LogReading } from '../../shared/intake/readLog.ts';
import type {
  LogAnswer,
  LogMappingInput,
  TrialLog,
  TrialLogList,
} from '../../shared/schemas/trialLog.ts';
import type { AppDeps } from '../appDeps.ts';
import { errorNumber, inTransaction } from '../database/inTransaction.ts';
import { BuildUpRow } from '../entities/BuildUpRow.ts';
import { ConfigurationRow } from '../entities/ConfigurationRow.ts';
import { TrialLogRow } from '../entities/TrialLogRow.ts';
import type { UploadedFile } from '../http/defineRoute.ts';
import { invalid, notFound, unsupported } from '../http/problem.ts';
import { cachedBoundary } from './currentBoundary.ts';
import { insertConfiguration } from './configurations.ts';
import { insertTrials } from './insertTrials.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { requireFixture, touchFixture } from './touchFixture.ts';
import { verdictChanges } from './verdictChanges.ts';

const duplicateKey = 1062;
/** Problems a preview or a stored log keeps: enough to mend a file by, bounded for the wire. */
const mostProblems = 2000;
const mostPreviewed = 2000;

type Upload = { file: UploadedFile; mapping: LogMappingInput; fixtureId: number };

/** Reads an uploaded log and says what storing it would do. Stores nothing. */
export async function previewLog(deps: AppDeps, upload: Upload): Promise<LogAnswer> {
  const { manager } = deps.dataSource;
  const reading = await readUpload(deps, upload);
  const sha256 = sha256Of(upload.file.bytes);
  const twin = await findTwin(manager, upload.fixtureId, sha256);
  return answer(reading, { id: null, sha256, duplicateOf: twin?.id }, []);
}

/**
 * Stores a log whole: raw bytes, trials, refused rows, proposed configurations and the event, in
 * one transaction. The same bytes again are recognised, also when they arrive at the same time.
 *
 * @returns `stored` false when this very file is already there
 * @throws ProblemError 422 when no row can be stored
 */
export async function storeLog(
  deps: AppDeps,
  upload: Upload,
  actor: Actor,
): Promise<{ stored: boolean; answer: LogAnswer }> {
  const { fixtureId, file } = upload;
  const sha256 = sha256Of(file.bytes);
  const known = await findTwin(deps.dataSource.manager, fixtureId, sha256);
  const reading = await readUpload(deps, upload);
  if (known !== null) return duplicate(reading, known);
  if (reading.rows.length === 0) throw nothingToStore(reading);

  const before = await cachedBoundary(deps, fixtureId);
  let id: number;
  try {
    id = await inTransaction(deps.dataSource, (manager) =>
      insertLog(manager, upload, reading, sha256, deps.clock(), actor),
    );
  } catch (error) {
    if (errorNumber(error) !== duplicateKey) throw error;
    const winner = await findTwin(deps.dataSource.manager, fixtureId, sha256);
    if (winner === null) throw error;
    return duplicate(reading, winner);
  }
  const after = await cachedBoundary(deps, fixtureId);
  const changes = verdictChanges(before.result, after.result);
  return { stored: true, answer: answer(reading, { id, sha256 }, changes) };
}

async function insertLog(
  manager: EntityManager,
  { fixtureId, file }: Upload,
  reading: LogReading,
  sha256: string,
  now: Date,
  actor: Actor,
): Promise<number> {
  await touchFixture(manager, fixtureId, now);
  const result = await manager.insert(TrialLogRow, {
    ...{ fixtureId, sha256, fileName: file.name, size: file.bytes.length },
    raw: Buffer.from(file.bytes),
    accepted: reading.rows.length,
    refused: reading.refused,
    problems: reading.problems.slice(0, mostProblems),
    mapping: reading.mapping,
    ...{ createdAt: now, createdBy: actor.name },
  });
  const id = Number(result.identifiers[0]?.id);
  const added = new Map<string, number>();
  for (const { label, positionMm } of reading.newConfigurations) {
    const input = { label, positionMm, measuredInertia: null };
    added.set(label, await insertConfiguration(manager, fixtureId, input, actor));
  }
  await insertTrials(manager, { fixtureId, logId: id, rows: reading.rows, added });
  await recordEvent(manager, {
    actor,
    action: 'log stored',
    objectType: 'trial log',
    objectId: id,
    fixtureId,
    summary: `${file.name}: ${reading.rows.length} trials stored, ${reading.refused} refused`,
    after: { fileName: file.name, sha256, accepted: reading.rows.length, refused: reading.refused },
  });
  return id;
}

async function readUpload(
  deps: AppDeps,
  { file, mapping, fixtureId }: Upload,
): Promise<LogReading> {
  const { manager } = deps.dataSource;
  const fixture = await requireFixture(manager, fixtureId);
  const [configurations, buildUp] = await Promise.all([
    manager.find(ConfigurationRow, { where: { fixtureId }, order: { positionMm: 'ASC' } }),
    manager.findOne(BuildUpRow, { where: { fixtureId }, order: { revision: 'DESC' } }),
  ]);
  const reading = await deps.work.run<LogReading>('readLog', {
    bytes: file.bytes,
    mapping,
    context: {
      configurations: configurations.map(({ id, label, positionMm }) => ({
        id,
        label,
        positionMm,
      })),
      slide: buildUp?.content.slide ?? null,
      maxAcceleration: fixture.spec.drive.maxAcceleration,
    },
  });
  if (reading.refusal?.unsupported) throw unsupported(reading.refusal.reason);
  return reading;
}

function findTwin(
  manager: EntityManager,
  fixtureId: number,
  sha256: string,
): Promise<TrialLogRow | null> {
  return manager.findOneBy(TrialLogRow, { fixtureId, sha256 });
}

function duplicate(reading: LogReading, twin: TrialLogRow): { stored: false; answer: LogAnswer } {
  const { id, sha256, accepted, refused } = twin;
  const told = answer(reading, { id, sha256, duplicateOf: id }, []);
  return { stored: false, answer: { ...told, log: { ...told.log, accepted, refused } } };
}

function nothingToStore(reading: LogReading) {
  return invalid(
    reading.problems.slice(0, 200).map(({ row, column, value, reason }) => ({
      path: row === 0 ? 'file' : `row ${row}${column === null ? '' : `, ${column}`}`,
      message: value === null ? reason : `"${value}": ${reason}`,
    })),
    'No row of this log can be stored, so nothing was. Mend the rows named below and send it again.',
  );
}

function answer(
  reading: LogReading,
  log: { id: number | null; sha256: string; duplicateOf?: number | undefined },
  changes: string[],
): LogAnswer {
  return {
    log: {
      id: log.id,
      sha256: log.sha256,
      accepted: reading.rows.length,
      refused: reading.refused,
      ...(log.duplicateOf === undefined ? {} : { duplicateOf: log.duplicateOf }),
    },
    problems: reading.problems.slice(0, mostProblems),
    oddities: reading.oddities.slice(0, mostProblems),
    mapping: reading.mapping,
    headers: reading.headers,
    sample: reading.sample,
    preview: reading.rows
      .slice(0, mostPreviewed)
      .map(({ row, configuration, positionMm, acceleration, outcome }) => ({
        ...{ row, configuration, positionMm, acceleration, outcome },
      })),
    newConfigurations: reading.newConfigurations,
    changes,
  };
}

function sha256Of(bytes: Uint8Array): string {
  return createHash('sha256').update(bytes).digest('hex');
}

/** A fixture's logs, newest first. */
export async function listLogs(deps: AppDeps, fixtureId: number): Promise<TrialLogList> {
  const { manager } = deps.dataSource;
  await requireFixture(manager, fixtureId);
  const rows = await manager.find(TrialLogRow, { where: { fixtureId }, order: { id: 'DESC' } });
  return {
    items: rows.map(toLogRow),
  };
}

export async function getLog(deps: AppDeps, id: number): Promise<TrialLog> {
  const row = await deps.dataSource.manager.findOneBy(TrialLogRow, { id });
  if (row === null) throw notFound('log');
  return toTrialLog(row);
}

/** The uploaded bytes, as they came. */
export async function getRawLog(
  deps: AppDeps,
  id: number,
): Promise<{ fileName: string; raw: Buffer }> {
  const row = await deps.dataSource.manager.findOne(TrialLogRow, {
    select: { id: true, fileName: true, raw: true },
    where: { id },
  });
  if (row === null) throw notFound('log');
  return row;
}

function toTrialLog(row: TrialLogRow): TrialLog {
  return { ...toLogRow(row), problems: row.problems, mapping: row.mapping };
}

function toLogRow(row: TrialLogRow): TrialLogList['items'][number] {
  return {
    id: row.id,
    fixtureId: row.fixtureId,
    fileName: row.fileName,
    size: row.size,
    sha256: row.sha256,
    accepted: row.accepted,
    refused: row.refused,
    createdAt: row.createdAt.toISOString(),
    createdBy: row.createdBy,
  };
}
