import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { engineeringScale, logTicks } from '../../../src/charts/axisTicks.ts';
import { withOpacity } from '../../../src/charts/chartTheme.ts';
import { escapeMarkup } from '../../../src/charts/escapeMarkup.ts';
import { inertiaCurve } from '../../../src/charts/inertiaCurve.ts';
import { interpolateLog } from '../../../src/charts/interpolate.ts';
import { spreadColumn } from '../../../src/charts/spreadColumn.ts';

describe('logTicks', () => {
  it('marks two decades by 1 and 3', () => {
    expect(logTicks(1, 100)).toEqual([1, 3, 10, 30, 100]);
  });

  it('finds at least four marks on an axis of half a decade', () => {
    expect(logTicks(4e-4, 1.4e-3).length).toBeGreaterThanOrEqual(4);
  });

  it('refuses an axis that reaches zero', () => {
    expect(() => logTicks(0, 10)).toThrow(RangeError);
  });
});

describe('engineeringScale', () => {
  it('writes 0.00081 kg·m² as 0.81 · 10⁻³', () => {
    expect(engineeringScale(0.00081)).toEqual({ factor: 1e-3, prefix: '10⁻³ ' });
  });

  it('leaves numbers of ordinary size alone', () => {
    expect(engineeringScale(2.5).prefix).toBe('');
  });
});

describe('spreadColumn', () => {
  it('stands marks that do not touch in one lane beside the middle', () => {
    expect(spreadColumn([1, 2, 3], 0.5)).toEqual([1, 1, 1]);
  });

  it('puts equal marks at different steps', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 200 }),
        fc.double({ min: -5, max: 5, noNaN: true }),
        (n, height) => {
          const steps = spreadColumn(new Array<number>(n).fill(height), 0.1);
          expect(new Set(steps).size).toBe(n);
          expect(steps).not.toContain(0);
        },
      ),
    );
  });
});

describe('inertiaCurve', () => {
  const polynomial = [3e-4, 0, 0.1];

  it('is the polynomial in metres where the configurations agree with it', () => {
    const at = inertiaCurve(polynomial, [
      { x: 20, y: 3e-4 + 0.1 * 0.02 ** 2 },
      { x: 120, y: 3e-4 + 0.1 * 0.12 ** 2 },
    ]);
    expect(at(70)).toBeCloseTo(3e-4 + 0.1 * 0.07 ** 2, 12);
  });

  it('passes through a measured inertia', () => {
    const at = inertiaCurve(polynomial, [
      { x: 20, y: 4e-4 },
      { x: 120, y: 2e-3 },
    ]);
    expect(at(20)).toBeCloseTo(4e-4, 12);
    expect(at(120)).toBeCloseTo(2e-3, 12);
  });

  it('joins the configurations where there is no build-up', () => {
    const at = inertiaCurve(null, [
      { x: 0, y: 1 },
      { x: 10, y: 4 },
    ]);
    expect(at(5)).toBeCloseTo(2, 12);
  });

  it('has no value where the polynomial is not above zero', () => {
    expect(inertiaCurve([-1], [{ x: 0, y: 1 }])(5)).toBeNull();
  });
});

describe('interpolateLog', () => {
  it('stays level beyond the ends', () => {
    expect(
      interpolateLog(
        [
          { x: 1, y: 2 },
          { x: 2, y: 8 },
        ],
        9,
      ),
    ).toBe(8);
  });

  it('refuses to draw from nothing', () => {
    expect(() => interpolateLog([], 1)).toThrow(RangeError);
  });
});

describe('escapeMarkup', () => {
  it('leaves nothing that could be read as markup, and loses nothing', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const escaped = escapeMarkup(text);
        expect(escaped).not.toMatch(/[<>]/);
        const back = escaped
          .replaceAll('&lt;', '<')
          .replaceAll('&gt;', '>')
          .replaceAll('&amp;', '&');
        expect(back).toBe(text);
      }),
    );
  });
});

describe('withOpacity', () => {
  it('reads what a browser computes and what the tokens say', () => {
    expect(withOpacity('#0E6B67', 0.5)).toBe('rgba(14, 107, 103, 0.5)');
    expect(withOpacity('rgb(14, 107, 103)', 0.5)).toBe('rgba(14, 107, 103, 0.5)');
  });

  it('refuses a colour it cannot read', () => {
    expect(() => withOpacity('tomato', 1)).toThrow(RangeError);
  });
});
