import { ENGINE } from '../../shared/judge.ts';
import type {
  StoredAnalysis,
  StoredAnalysisInput,
  StoredAnalysisList,
} from '../../shared/schemas/analysis.ts';
import type { AppDeps } from '../appDeps.ts';
import { inTransaction } from '../database/inTransaction.ts';
import { AnalysisRow } from '../entities/AnalysisRow.ts';
import { invalid, notFound } from '../http/problem.ts';
import { inputDigest, snapshot, withNotes } from './currentBoundary.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { runAnalysis } from './runAnalysis.ts';
import { toAnalysisRequest } from './toAnalysisRequest.ts';
import { requireFixture } from './touchFixture.ts';

/**
 * Runs the analysis on the stored trials and keeps it with all that went in.
 *
 * @throws ProblemError 422 when there is nothing to analyse yet, saying what to do
 */
export async function saveAnalysis(
  deps: AppDeps,
  fixtureId: number,
  { note, ...options }: StoredAnalysisInput,
  actor: Actor,
): Promise<StoredAnalysis> {
  const data = await snapshot(deps, fixtureId);
  const prepared = toAnalysisRequest(data, options);
  const { request, theory } = prepared;
  if (request === null) throw invalid([{ path: 'trials', message: prepared.reason ?? '' }]);
  const result = withNotes(await runAnalysis(deps, request), theory.notes);
  if (result === null) throw new Error('an analysis has a result');
  const digest = inputDigest(prepared, data);
  return inTransaction(deps.dataSource, async (manager) => {
    const inserted = await manager.insert(AnalysisRow, {
      ...{ fixtureId, digest, options, request, result, note },
      buildUpRevision: data.buildUp?.revision ?? null,
      dataVersion: data.fixture.dataVersion,
      createdAt: deps.clock(),
      createdBy: actor.name,
    });
    const id = Number(inserted.identifiers[0]?.id);
    await recordEvent(manager, {
      actor,
      action: 'analysis saved',
      objectType: 'analysis',
      objectId: id,
      fixtureId,
      summary: `${result.counts.trials} trials: ${result.verdict}`,
      after: { digest, options, note, engine: ENGINE },
    });
    const row = await manager.findOneByOrFail(AnalysisRow, { id });
    return toStoredAnalysis(row);
  });
}

export async function getAnalysis(deps: AppDeps, id: number): Promise<StoredAnalysis> {
  const row = await deps.dataSource.manager.findOneBy(AnalysisRow, { id });
  if (row === null) throw notFound('analysis');
  return toStoredAnalysis(row);
}

/** A fixture's kept analyses, newest first. */
export async function listAnalyses(deps: AppDeps, fixtureId: number): Promise<StoredAnalysisList> {
  const { manager } = deps.dataSource;
  const fixture = await requireFixture(manager, fixtureId);
  const rows = await manager.find(AnalysisRow, { where: { fixtureId }, order: { id: 'DESC' } });
  return {
    items: rows.map((row) => ({
      id: row.id,
      digest: row.digest,
      createdAt: row.createdAt.toISOString(),
      createdBy: row.createdBy,
      note: row.note,
      verdict: row.result.verdict,
      trials: row.result.counts.trials,
      current: row.dataVersion === fixture.dataVersion,
    })),
  };
}

function toStoredAnalysis(row: AnalysisRow): StoredAnalysis {
  return {
    ...row.result,
    id: row.id,
    fixtureId: row.fixtureId,
    digest: row.digest,
    buildUpRevision: row.buildUpRevision,
    options: row.options,
    note: row.note,
    createdAt: row.createdAt.toISOString(),
    createdBy: row.createdBy,
  };
}
