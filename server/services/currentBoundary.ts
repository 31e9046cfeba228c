import type { EntityManager } from 'typeorm';
import { ENGINE } from '../../shared/judge.ts';
import {
  analysisOptionsSchema,
  type AnalysisResult,
  type Boundary,
} from '../../shared/schemas/analysis.ts';
import { verdicts } from '../../shared/schemas/verdict.ts';
import type { AppDeps } from '../appDeps.ts';
import { inTransaction } from '../database/inTransaction.ts';
import { AnalysisRow } from '../entities/AnalysisRow.ts';
import { BoundaryCacheRow } from '../entities/BoundaryCacheRow.ts';
import { FixtureRow } from '../entities/FixtureRow.ts';
import { ProblemError } from '../http/problem.ts';
import { digestOf } from './digest.ts';
import { loadFixtureData, type FixtureData } from './fixtureData.ts';
import { runAnalysis } from './runAnalysis.ts';
import { toAnalysisRequest, type PreparedAnalysis } from './toAnalysisRequest.ts';

export const defaultOptions = analysisOptionsSchema.parse({});

/** What the Boundary screen shows: the analysis of the trials as they are now. */
export async function getBoundary(deps: AppDeps, fixtureId: number): Promise<Boundary> {
  const { manager } = deps.dataSource;
  const data = await snapshot(deps, fixtureId);
  const prepared = toAnalysisRequest(data, defaultOptions);
  const cached = await currentCache(deps, data, prepared);
  const lastSaved = await manager.findOne(AnalysisRow, {
    select: { id: true, createdAt: true, digest: true },
    where: { fixtureId },
    order: { id: 'DESC' },
  });
  const { theory } = prepared;
  return {
    fixtureId,
    digest: cached.digest,
    buildUpRevision: data.buildUp?.revision ?? null,
    result: withNotes(cached.result, theory.notes),
    reason: cached.result === null ? cached.sentence : null,
    options: defaultOptions,
    polynomial: theory.polynomial,
    positions: theory.configurations.map(({ label, positionMm, inertia }) => ({
      label,
      positionMm,
      inertia,
    })),
    excluded: data.excluded,
    torquePerMu: theory.torquePerMu,
    lastSaved:
      lastSaved === null
        ? null
        : {
            id: lastSaved.id,
            createdAt: lastSaved.createdAt.toISOString(),
            digest: lastSaved.digest,
          },
  };
}

/** The cached row of a fixture, computed first when the data have moved on. */
export async function cachedBoundary(deps: AppDeps, fixtureId: number): Promise<BoundaryCacheRow> {
  const data = await snapshot(deps, fixtureId);
  return currentCache(deps, data, toAnalysisRequest(data, defaultOptions));
}

/** Brings every stale verdict up to date, so that lists can be filtered and sorted by it. */
export async function refreshBoundaries(deps: AppDeps): Promise<void> {
  const stale = await deps.dataSource
    .createQueryBuilder(FixtureRow, 'fixture')
    .leftJoin(BoundaryCacheRow, 'cache', 'cache.fixtureId = fixture.id')
    .select('fixture.id', 'id')
    .where('cache.fixtureId IS NULL')
    .orWhere('cache.dataVersion <> fixture.dataVersion')
    .orWhere('cache.engine <> :engine', { engine: ENGINE })
    .getRawMany<{ id: number }>();
  for (const { id } of stale) await cachedBoundary(deps, id);
}

/** @returns the digest of what goes into an analysis */
export function inputDigest(prepared: PreparedAnalysis, data: FixtureData): string {
  return digestOf({ request: prepared.request, buildUpRevision: data.buildUp?.revision ?? null });
}

/** What theory had to leave out belongs beside the core's own notes. */
export function withNotes<R extends { notes: string[] }>(
  result: R | null,
  notes: string[],
): R | null {
  return result === null ? null : { ...result, notes: [...result.notes, ...notes] };
}

/** All parts of a fixture as of one moment. */
export function snapshot(deps: AppDeps, fixtureId: number): Promise<FixtureData> {
  return inTransaction(deps.dataSource, (manager) => loadFixtureData(manager, fixtureId));
}

async function currentCache(
  deps: AppDeps,
  data: FixtureData,
  prepared: PreparedAnalysis,
): Promise<BoundaryCacheRow> {
  const { id: fixtureId, dataVersion } = data.fixture;
  const { manager } = deps.dataSource;
  const cached = await manager.findOneBy(BoundaryCacheRow, { fixtureId });
  if (cached?.dataVersion === dataVersion && cached.engine === ENGINE) return cached;

  const { result, reason } = await analyseOrSay(deps, prepared);
  const verdict = result?.verdict ?? 'not checked';
  const { friction } = prepared.theory;
  const row: BoundaryCacheRow = {
    ...{ fixtureId, dataVersion, engine: ENGINE, verdict, result },
    digest: inputDigest(prepared, data),
    verdictRank: verdicts.indexOf(verdict),
    sentence: result?.sentence ?? reason ?? '',
    benchMu: (friction.kinetic ?? friction.static)?.mean ?? null,
  };
  await storeCache(manager, row);
  return row;
}

/**
 * One fixture whose stored data the core refuses must not take the lists of all others down: it is
 * then not checked, and says why.
 */
async function analyseOrSay(
  deps: AppDeps,
  { request, reason }: PreparedAnalysis,
): Promise<{ result: AnalysisResult | null; reason: string | null }> {
  if (request === null) return { result: null, reason };
  try {
    return { result: await runAnalysis(deps, request), reason: null };
  } catch (error) {
    if (!(error instanceof ProblemError) || error.status !== 422) throw error;
    return { result: null, reason: `These data cannot be analysed: ${error.message}` };
  }
}

/** A slower request must not put an older verdict back: the data version only goes up. */
async function storeCache(manager: EntityManager, row: BoundaryCacheRow): Promise<void> {
  const { fixtureId } = row;
  const made = await manager
    .createQueryBuilder()
    .insert()
    .into(BoundaryCacheRow)
    .values(row)
    .orIgnore()
    .execute();
  if ((made.raw as { affectedRows: number }).affectedRows === 1) return;
  await manager
    .createQueryBuilder()
    .update(BoundaryCacheRow)
    .set(row)
    .where('fixture_id = :fixtureId AND data_version <= :version', {
      fixtureId,
      version: row.dataVersion,
    })
    .execute();
}
