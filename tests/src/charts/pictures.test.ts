import type { ScatterData } from 'plotly.js';
import { describe, expect, it } from 'vitest';
import { type ParityPoint } from '../../../shared/schemas/overview.ts';
import { verdicts } from '../../../shared/schemas/verdict.ts';
import { lightTheme } from '../../../src/charts/chartTheme.ts';
import { drawParity } from '../../../src/charts/drawParity.ts';
import { drawRunOrder } from '../../../src/charts/drawRunOrder.ts';
import { verdictMarks } from '../../../src/charts/verdictMarks.ts';

function point(over: Partial<ParityPoint> = {}): ParityPoint {
  return {
    fixtureId: 1,
    code: 'TT-2',
    label: '70 mm',
    theory: 12,
    fitted: { estimate: 9, lower: 8.5, upper: 9.6 },
    verdict: 'slips early',
    ...over,
  };
}

describe('the parity picture', () => {
  it('has equal axes and the 1:1 line from corner to corner', () => {
    const { data, layout } = drawParity([point(), point({ theory: 40 })], lightTheme);
    expect(layout.xaxis?.range).toEqual(layout.yaxis?.range);
    const { x, y } = (data as ScatterData[])[0] ?? {};
    expect(y).toEqual(x);
  });

  it('draws one mark a configuration and none where nothing could be fitted', () => {
    const points = [point(), point({ fitted: { estimate: null, lower: null, upper: null } })];
    const marks = (drawParity(points, lightTheme).data as ScatterData[]).filter(
      ({ customdata }) => customdata !== undefined,
    );
    expect(marks.flatMap(({ x }) => x as number[])).toEqual([12]);
  });

  it('can be drawn when there is nothing to compare yet', () => {
    expect(() => drawParity([], lightTheme)).not.toThrow();
  });

  it('gives every verdict a shape of its own', () => {
    expect(new Set(verdicts.map((verdict) => verdictMarks[verdict].symbol)).size).toBe(
      verdicts.length,
    );
  });
});

describe('the run-order picture', () => {
  it('draws every trial at its order, outcomes and excluded ones apart', () => {
    const trials = (['held', 'slipped', 'lost', 'held'] as const).map((outcome, i) => ({
      id: i,
      order: i + 1,
      acceleration: 10 + i,
      outcome,
      excluded: i === 3,
      words: 'a < b',
    }));
    const data = drawRunOrder(trials, lightTheme).data as ScatterData[];
    expect(data).toHaveLength(4);
    expect(data.flatMap(({ hovertext }) => hovertext)).not.toContain('a < b');
    expect(data.flatMap(({ x }) => x as number[]).sort()).toEqual([1, 2, 3, 4]);
  });
});
