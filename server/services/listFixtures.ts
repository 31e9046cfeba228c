import type { Page } from '../../shared/schemas/common.ts';
import type { FixtureQuery, FixtureRow as ListRow } from '../../shared/schemas/fixture.ts';
import type { AppDeps } from '../appDeps.ts';
import { BoundaryCacheRow } from '../entities/BoundaryCacheRow.ts';
import { FixtureRow } from '../entities/FixtureRow.ts';
import { refreshBoundaries } from './currentBoundary.ts';

const orders = {
  code: ['fixture.code', 'ASC'],
  '-code': ['fixture.code', 'DESC'],
  name: ['fixture.name', 'ASC'],
  '-name': ['fixture.name', 'DESC'],
  line: ['fixture.line', 'ASC'],
  '-line': ['fixture.line', 'DESC'],
  verdict: ['cache.verdictRank', 'ASC'],
  '-verdict': ['cache.verdictRank', 'DESC'],
  trials: ['trials', 'ASC'],
  '-trials': ['trials', 'DESC'],
} as const satisfies Record<FixtureQuery['sort'], readonly [string, 'ASC' | 'DESC']>;

type RawCounts = { configurations: string; trials: string; lastTrialAt: Date | null };

/** A page of the fixtures list, with every line there is for the filter. */
export async function listFixtures(
  deps: AppDeps,
  query: FixtureQuery,
): Promise<Page<ListRow> & { lines: string[] }> {
  await refreshBoundaries(deps);
  const { search, line, verdict, sort, page, pageSize } = query;
  const rows = deps.dataSource
    .createQueryBuilder(FixtureRow, 'fixture')
    .innerJoinAndMapOne('fixture.cache', BoundaryCacheRow, 'cache', 'cache.fixtureId = fixture.id');
  if (search !== undefined && search.trim() !== '') {
    rows.andWhere('(fixture.code LIKE :search OR fixture.name LIKE :search)', {
      search: `%${search.trim().replace(/[\\%_]/g, '\\$&')}%`,
    });
  }
  if (line !== undefined) rows.andWhere('fixture.line = :line', { line });
  if (verdict !== undefined) rows.andWhere('cache.verdict = :verdict', { verdict });
  const total = await rows.getCount();

  const [column, direction] = orders[sort];
  const { entities, raw } = await rows
    .addSelect(
      '(SELECT COUNT(*) FROM configuration c WHERE c.fixture_id = fixture.id)',
      'configurations',
    )
    .addSelect(
      '(SELECT COUNT(*) FROM trial t WHERE t.fixture_id = fixture.id AND NOT t.excluded)',
      'trials',
    )
    .addSelect(
      '(SELECT MAX(l.created_at) FROM trial_log l WHERE l.fixture_id = fixture.id)',
      'lastTrialAt',
    )
    .orderBy(column, direction)
    .addOrderBy('fixture.id', 'ASC')
    .offset((page - 1) * pageSize)
    .limit(pageSize)
    .getRawAndEntities<RawCounts>();

  const items = entities.map((entity, index) => {
    const { cache } = entity as FixtureRow & { cache: BoundaryCacheRow };
    const counts = raw[index];
    return {
      id: entity.id,
      code: entity.code,
      name: entity.name,
      line: entity.line,
      status: entity.status,
      configurations: Number(counts?.configurations ?? 0),
      trials: Number(counts?.trials ?? 0),
      verdict: cache.verdict,
      sentence: cache.sentence,
      lastTrialAt: counts?.lastTrialAt?.toISOString() ?? null,
    };
  });
  return { items, total, page, pageSize, lines: await linesOf(deps) };
}

async function linesOf(deps: AppDeps): Promise<string[]> {
  const rows = await deps.dataSource
    .createQueryBuilder(FixtureRow, 'fixture')
    .select('fixture.line', 'line')
    .distinct(true)
    .orderBy('fixture.line')
    .getRawMany<{ line: string }>();
  return rows.map((row) => row.line);
}
