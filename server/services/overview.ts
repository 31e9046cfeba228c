import { moveTime, partsPerHour } from '../../shared/physics/moveTime.ts';
import type { AnalysisResult, ConfigurationResult } from '../../shared/schemas/analysis.ts';
import type { Overview, OverviewRow, ParityPoint } from '../../shared/schemas/overview.ts';
import { toRadians } from '../../shared/units/angle.ts';
import type { AppDeps } from '../appDeps.ts';
import { BoundaryCacheRow } from '../entities/BoundaryCacheRow.ts';
import { FixtureRow, type FixtureSpec } from '../entities/FixtureRow.ts';
import { TrialLogRow } from '../entities/TrialLogRow.ts';
import { refreshBoundaries } from './currentBoundary.ts';
import { needsAttention } from './needsAttention.ts';

const none = { estimate: null, lower: null, upper: null };
const marginOrder = ['breached', 'not shown', 'not checked', 'shown'] as const;

/** The manager's table and the parity picture, worst verdict first. */
export async function getOverview(deps: AppDeps): Promise<Overview> {
  await refreshBoundaries(deps);
  const { manager } = deps.dataSource;
  const [fixtures, caches, lastLogs] = await Promise.all([
    manager.find(FixtureRow, { order: { code: 'ASC' } }),
    manager.find(BoundaryCacheRow),
    manager
      .createQueryBuilder(TrialLogRow, 'log')
      .select('log.fixtureId', 'id')
      .addSelect('MAX(log.createdAt)', 'at')
      .groupBy('log.fixtureId')
      .getRawMany<{ id: number; at: Date }>(),
  ]);
  const cacheOf = new Map(caches.map((cache) => [cache.fixtureId, cache]));
  const lastLogOf = new Map(lastLogs.map((log) => [log.id, log.at]));
  const judged = fixtures.flatMap((fixture) => {
    const cache = cacheOf.get(fixture.id);
    return cache === undefined || fixture.status === 'retired' ? [] : [{ fixture, cache }];
  });
  judged.sort((a, b) => a.cache.verdictRank - b.cache.verdictRank);
  const rows = judged.map(({ fixture, cache }) =>
    toRow(fixture, cache, lastLogOf.get(fixture.id) ?? null),
  );
  return {
    sentence: needsAttention(
      judged.map(({ fixture, cache }) => ({ code: fixture.code, ...cache })),
    ),
    rows,
    parity: judged.flatMap(({ fixture, cache }) => parityOf(fixture, cache.result)),
  };
}

function toRow(fixture: FixtureRow, cache: BoundaryCacheRow, lastLog: Date | null): OverviewRow {
  const { result } = cache;
  const tightest = tightestOf(result);
  return {
    fixtureId: fixture.id,
    code: fixture.code,
    name: fixture.name,
    line: fixture.line,
    verdict: cache.verdict,
    sentence: cache.sentence,
    tightest:
      tightest === null || tightest.workingLimit === null
        ? null
        : { label: tightest.label, limit: tightest.workingLimit },
    mu50: result?.mu50 ?? none,
    benchMu: cache.benchMu,
    margin: worstMargin(result),
    partsPerHour: priceOf(fixture.spec, tightest),
    trials: result?.counts.trials ?? 0,
    lastTrialAt: lastLog?.toISOString() ?? null,
  };
}

/** The configuration with the lowest working limit; without any limit, with the lowest theory. */
function tightestOf(result: AnalysisResult | null): ConfigurationResult | null {
  const height = (one: ConfigurationResult) =>
    one.workingLimit ?? one.theory.holding ?? one.theory.lettingGo ?? Infinity;
  return (
    result?.configurations.reduce<ConfigurationResult | null>(
      (least, one) => (least === null || height(one) < height(least) ? one : least),
      null,
    ) ?? null
  );
}

function priceOf(
  { move, drive }: FixtureSpec,
  tightest: ConfigurationResult | null,
): OverviewRow['partsPerHour'] {
  const theory = tightest?.theory.holding ?? tightest?.theory.lettingGo ?? null;
  if (tightest === null || theory === null) return null;
  const at = (acceleration: number) =>
    partsPerHour(
      moveTime(toRadians(move.angleDeg), Math.min(acceleration, drive.maxAcceleration), drive),
      move.dwell,
    );
  const limit = tightest.workingLimit;
  return { theory: at(theory), limit: limit === null || limit <= 0 ? null : at(limit) };
}

function worstMargin(result: AnalysisResult | null): OverviewRow['margin'] {
  const states = result?.configurations.map((one) => one.margin.state) ?? [];
  return marginOrder.find((state) => states.includes(state)) ?? 'not checked';
}

function parityOf(fixture: FixtureRow, result: AnalysisResult | null): ParityPoint[] {
  return (result?.configurations ?? []).flatMap((one) => {
    const theory = one.theory.holding ?? one.theory.lettingGo;
    if (theory === null) return [];
    const setApart = one.shape.state === 'early' || one.shape.state === 'late';
    const { scaled, offsets } = one.alpha50;
    return [
      {
        fixtureId: fixture.id,
        code: fixture.code,
        label: one.label,
        theory,
        fitted: setApart || one.shape.state === 'no common curve' ? offsets : scaled,
        verdict: one.verdict,
      },
    ];
  });
}
