import { describe, expect, it } from 'vitest';
import type { OverviewRow, ParityPoint } from '../../../shared/schemas/overview.ts';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { groupNotes } from '../../../src/features/boundary/groupNotes.ts';
import { percent } from '../../../src/features/boundary/percent.ts';
import { trustWords } from '../../../src/features/boundary/trustWords.ts';
import { uploadScene } from '../../../src/features/boundary/uploadScene.ts';
import { worstConfiguration } from '../../../src/features/boundary/worstConfiguration.ts';
import { parityAlternative } from '../../../src/features/overview/parityAlternative.ts';
import { partsChange } from '../../../src/features/overview/partsChange.ts';
import { placeInOrder } from '../../../src/features/trials/placeInOrder.ts';
import { refusalOfFile } from '../../../src/features/trials/refusalOfFile.ts';
import { planWords } from '../../../src/features/trials/uploadWords.ts';
import { analysisResult, boundaryOf, configurationResult } from './boundaryFixtures.ts';

describe('what storing a log will do', () => {
  const log = { id: null, sha256: '', accepted: 118, refused: 4 };
  const odd = (row: number) => ({ row, column: null, value: null, reason: '' });

  it('counts rows stored, refused and odd, an odd row once', () => {
    expect(planWords({ log, oddities: [odd(3), odd(3), odd(9), odd(0)] })).toBe(
      '118 rows will be stored, 4 refused, 2 look odd.',
    );
  });

  it('leaves out what does not happen', () => {
    expect(planWords({ log: { ...log, accepted: 1, refused: 0 }, oddities: [] })).toBe(
      '1 row will be stored.',
    );
  });

  it('says that nothing can be stored', () => {
    expect(planWords({ log: { ...log, accepted: 0 }, oddities: [] })).toBe(
      'No row can be stored: all 4 are refused.',
    );
  });
});

describe('a file that cannot be a log', () => {
  it('is refused above 16 MiB and taken at 16 MiB', () => {
    const size = 16 * 1024 * 1024;
    expect(refusalOfFile({ name: 'a.csv', size })).toBeNull();
    expect(refusalOfFile({ name: 'a.csv', size: size + 1 })).toContain('larger than 16 MiB');
  });
});

describe('the map of a log about to be stored', () => {
  const row = {
    row: 5,
    configuration: '33 mm',
    positionMm: 33,
    acceleration: 21,
    outcome: 'held' as const,
  };

  it('gives a new position a column of its own and draws the row in front', () => {
    const boundary = boundaryOf(analysisResult([configurationResult()]));
    const scene = uploadScene(boundary, [], 90, [row]);
    expect(scene.configurations.map(({ label }) => label)).toEqual(['45 mm', '33 mm']);
    expect(scene.trials).toMatchObject([{ id: 'row 5', fresh: true, configuration: '33 mm' }]);
  });

  it('works before the first trial', () => {
    const scene = uploadScene(boundaryOf(null), [], null, [row]);
    expect(scene.configurations).toHaveLength(1);
    expect(scene.torque50).toBeNull();
  });
});

describe('notes', () => {
  it('are said once for all configurations they hold for', () => {
    const notes = ['20 mm: is far.', 'All in all.', '45 mm: is far.'];
    expect(groupNotes(notes, ['20 mm', '45 mm'])).toEqual(['20 mm, 45 mm: is far.', 'All in all.']);
  });
});

describe('trust in the fit', () => {
  it('says that complete separation leaves the steepness to the penalty', () => {
    const result = analysisResult([configurationResult()]);
    const separated = {
      ...result,
      separation: { overall: 'complete' as const, configurations: {} },
    };
    expect(trustWords(separated, 0.95)[0]).toContain('All slips lie above all holds');
  });

  it('names a drift only when the trials show one', () => {
    const result = analysisResult([configurationResult()]);
    const drifting = (p: number) => ({
      ...result,
      diagnostics: { ...result.diagnostics, drift: { change: 0.83, p } },
    });
    expect(trustWords(drifting(0.001), 0.95)[1]).toContain('changed while the trials ran: ×0.83');
    expect(trustWords(drifting(0.4), 0.95)[1]).toContain('No drift');
    expect(trustWords(result, 0.95)).toHaveLength(1);
  });
});

describe('small words', () => {
  it('write a share without idle zeros', () => {
    expect([percent(0.01), percent(0.393), percent(0.044), percent(0.9995, 4)]).toEqual([
      '1\u00A0%',
      '39\u00A0%',
      '4.4\u00A0%',
      '99.95\u00A0%',
    ]);
  });

  it('open the worst configuration when nobody has chosen', () => {
    const worst = configurationResult({ label: 'b', verdict: 'breached' });
    expect(worstConfiguration([configurationResult(), worst])?.label).toBe('b');
    expect(worstConfiguration([])).toBeNull();
  });

  it('say what a limit costs against theory', () => {
    const row = { partsPerHour: { theory: 1500, limit: 1412.3 } } as OverviewRow;
    expect(partsChange(row)).toEqual({ rate: '1412', change: '−5.8 %' });
    expect(partsChange({ ...row, partsPerHour: null }).rate).toBe('–');
  });

  it('name the configurations clearly below theory', () => {
    const point = {
      fixtureId: 1,
      code: 'TT-2',
      label: '70 mm',
      theory: 12,
      fitted: { estimate: 9, lower: 8.6, upper: 9.7 },
      verdict: 'slips early',
    } satisfies ParityPoint;
    expect(parityAlternative([point])).toContain(
      'Clearly below the line where both agree: TT-2 70 mm',
    );
    expect(parityAlternative([])).toContain('nothing to compare yet');
  });

  it('put trials in the order they were run, log after log', () => {
    const trial = (logId: number, row: number, order: number | null) =>
      ({ logId, row, order }) as Trial;
    const placed = placeInOrder([
      trial(2, 2, 1),
      trial(1, 3, 1),
      trial(1, 2, 2),
      trial(2, 9, null),
    ]);
    expect(placed.map(({ trial: { logId, row }, order }) => [order, logId, row])).toEqual([
      [1, 1, 3],
      [2, 1, 2],
      [3, 2, 2],
      [4, 2, 9],
    ]);
  });
});
