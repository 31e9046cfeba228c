import type { ScatterData } from 'plotly.js';
import { describe, expect, it } from 'vitest';
import { drawBoundaryMap } from '../../../src/charts/boundaryMap/drawBoundaryMap.ts';
import { alongX, mapFrame } from '../../../src/charts/boundaryMap/mapFrame.ts';
import { placeTrials } from '../../../src/charts/boundaryMap/mapMarks.ts';
import {
  type MapConfiguration,
  type MapScene,
  type MapTrial,
} from '../../../src/charts/boundaryMap/mapScene.ts';
import { lightTheme } from '../../../src/charts/chartTheme.ts';

const torque = 0.0165;
const inertias = [4e-4, 6.9e-4, 1.4e-3];

const configurations: MapConfiguration[] = inertias.map((inertia, i) => ({
  label: `${20 + 25 * i} mm`,
  positionMm: 20 + 25 * i,
  inertia,
  alpha50: {
    estimate: torque / inertia,
    lower: (0.95 * torque) / inertia,
    upper: (1.05 * torque) / inertia,
  },
  setApart: false,
  holding: (0.9 * torque) / inertia,
  lettingGo: (1.2 * torque) / inertia,
  workingLimit: (0.6 * torque) / inertia,
}));

function trial(id: number, over: Partial<MapTrial> = {}): MapTrial {
  return {
    id: String(id),
    configuration: '20 mm',
    acceleration: 20,
    outcome: 'held',
    excluded: false,
    fresh: false,
    words: `trial ${id}`,
    ...over,
  };
}

function scene(over: Partial<MapScene> = {}): MapScene {
  return {
    view: 'inertia',
    scale: 'log',
    configurations,
    trials: [trial(1), trial(2, { outcome: 'slipped', acceleration: 50 })],
    torque50: { estimate: torque, lower: 0.95 * torque, upper: 1.05 * torque },
    limitTorque: 0.6 * torque,
    driveLimit: 45,
    inertiaAt: (positionMm) => 3e-4 + 1e-7 * positionMm ** 2,
    chosen: null,
    ...over,
  };
}

function traces(drawn: MapScene): ScatterData[] {
  return drawBoundaryMap(drawn, lightTheme).data as ScatterData[];
}

function named(drawn: MapScene, name: string): ScatterData {
  const found = traces(drawn).find((trace) => trace.name === name);
  if (found === undefined) throw new Error(`no trace called ${name}`);
  return found;
}

const numbers = (values: ScatterData['x']) => values as (number | null)[];

describe('the boundary map', () => {
  it('draws τ/I as a straight line of slope −1 on log axes against inertia', () => {
    const curve = named(scene(), 'fitted 50 % curve');
    const x = numbers(curve.x).map((value) => Math.log(value ?? NaN));
    const y = numbers(curve.y).map((value) => Math.log(value ?? NaN));
    for (let i = 1; i < x.length; i += 1) {
      expect(((y[i] ?? 0) - (y[i - 1] ?? 0)) / ((x[i] ?? 0) - (x[i - 1] ?? 0))).toBeCloseTo(-1, 9);
    }
  });

  it('draws τ/I(x) against position, with the build-up between the configurations', () => {
    const curve = named(scene({ view: 'position' }), 'fitted 50 % curve');
    const x = numbers(curve.x);
    const y = numbers(curve.y);
    const middle = 40;
    expect(y[middle]).toBeCloseTo(torque / (3e-4 + 1e-7 * (x[middle] ?? 0) ** 2), 9);
  });

  it('puts both bounds of theory through every configuration', () => {
    const holding = named(scene(), 'holding bound');
    const lettingGo = named(scene(), 'letting-go bound');
    numbers(holding.x).forEach((x, i) => {
      expect(numbers(holding.y)[i]).toBeCloseTo((0.9 * torque) / (x ?? 0), 9);
      expect(numbers(lettingGo.y)[i]).toBeCloseTo((1.2 * torque) / (x ?? 0), 9);
    });
  });

  it('draws one curve when only one kind of friction was tested, and none without tests', () => {
    const kinetic = configurations.map((one) => ({ ...one, lettingGo: null }));
    const names = traces(scene({ configurations: kinetic })).map(({ name }) => name);
    expect(names).toContain('holding bound');
    expect(names).not.toContain('letting-go bound');
    expect(names).not.toContain('theory band');
    const none = kinetic.map((one) => ({ ...one, holding: null }));
    expect(traces(scene({ configurations: none })).map(({ name }) => name)).not.toContain(
      'holding bound',
    );
  });

  it('keeps the working-limit curve inside the tested range and below the drive limit', () => {
    const curve = named(scene({ driveLimit: 20 }), 'working limit');
    expect(numbers(curve.x)[0]).toBeCloseTo(4e-4, 12);
    expect(numbers(curve.x).at(-1)).toBeCloseTo(1.4e-3, 12);
    expect(Math.max(...numbers(curve.y).map((y) => y ?? 0))).toBe(20);
  });

  it('leaves a drive limit far above the trials out of the picture', () => {
    expect(traces(scene({ driveLimit: 900 })).map(({ name }) => name)).not.toContain('drive limit');
    expect(mapFrame(scene({ driveLimit: 900 })).y[1]).toBeLessThan(100);
  });

  it('gives every outcome its own shape', () => {
    const three = [
      trial(1),
      trial(2, { outcome: 'slipped' }),
      trial(3, { outcome: 'lost' }),
      trial(4, { excluded: true }),
    ];
    const drawn = traces(scene({ trials: three })).filter(
      ({ customdata }) => customdata !== undefined,
    );
    const symbols = drawn
      .filter(({ name }) => ['held', 'slipped', 'lost', 'held, excluded'].includes(name ?? ''))
      .map(({ marker }) => marker?.symbol);
    expect(new Set(symbols).size).toBe(4);
  });

  it('shows every trial, equal ones side by side and within their column', () => {
    const many = Array.from({ length: 60 }, (_, i) => trial(i));
    const drawn = scene({ trials: many });
    const frame = mapFrame(drawn);
    const placed = placeTrials(drawn, frame);
    expect(placed).toHaveLength(60);
    expect(new Set(placed.map(({ x }) => x.toPrecision(12))).size).toBe(60);
    for (const { x } of placed) {
      expect(Math.abs(Math.log10(x) - Math.log10(4e-4))).toBeLessThanOrEqual(
        frame.halfColumn + 1e-12,
      );
    }
  });

  it('draws an end that the trials do not bound dotted to the edge, never as a number', () => {
    const open = configurations.map((one) => ({
      ...one,
      alpha50: { ...one.alpha50, upper: null },
    }));
    const drawn = scene({ configurations: open });
    expect(numbers(named(drawn, 'open interval').y)[1]).toBe(mapFrame(drawn).y[1]);
    expect(numbers(named(drawn, 'interval').y)).toHaveLength(9);
  });

  it('marks a configuration set apart with a shape of its own', () => {
    const apart = configurations.map((one, i) => ({ ...one, setApart: i === 1 }));
    const drawn = scene({ configurations: apart });
    expect(named(drawn, 'fitted').marker?.symbol).not.toBe(
      named(drawn, 'fitted, set apart').marker?.symbol,
    );
    expect(named(drawn, 'fitted, set apart').customdata).toEqual(['45 mm']);
  });

  it('draws no fitted curve where there is no common torque', () => {
    const names = traces(scene({ torque50: null })).map(({ name }) => name);
    expect(names).not.toContain('fitted 50 % curve');
  });

  it('shows markup in a label as written', () => {
    const hostile = configurations.map((one) => ({
      ...one,
      label: '<a href="javascript:x()">A</a>',
    }));
    const { data, layout } = drawBoundaryMap(
      scene({
        configurations: hostile,
        chosen: hostile[0]?.label ?? null,
        trials: [trial(1, { configuration: hostile[0]?.label ?? '', words: '<img src=x>' })],
      }),
      lightTheme,
    );
    const texts = [
      ...(layout.annotations ?? []).map(({ text }) => text ?? ''),
      ...(data as ScatterData[]).flatMap(({ hovertext }) => hovertext ?? []),
    ];
    expect(texts.length).toBeGreaterThan(0);
    for (const text of texts) expect(text.replaceAll(/<\/?b>|<br>/g, '')).not.toMatch(/[<>]/);
  });

  it('draws a single configuration', () => {
    const one = scene({ configurations: configurations.slice(0, 1) });
    expect(() => drawBoundaryMap(one, lightTheme)).not.toThrow();
    const [from, to] = mapFrame(one).x;
    expect(to).toBeGreaterThan(from);
  });

  it('refuses to draw without a configuration', () => {
    expect(() => drawBoundaryMap(scene({ configurations: [] }), lightTheme)).toThrow(RangeError);
  });

  it('spaces curve points evenly as drawn', () => {
    const xs = alongX(mapFrame(scene()), 5);
    const ratios = xs.slice(1).map((x, i) => x / (xs[i] ?? 1));
    for (const ratio of ratios) expect(ratio).toBeCloseTo(ratios[0] ?? 0, 9);
  });
});
