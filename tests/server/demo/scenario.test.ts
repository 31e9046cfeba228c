import { describe, expect, it } from 'vitest';
import { messyLog } from '../../../server/demo/messyLog.ts';
import { demoScenario, type DemoFixture } from '../../../server/demo/scenario.ts';
import { buildUpInputSchema } from '../../../shared/schemas/buildUp.ts';
import { configurationInputSchema } from '../../../shared/schemas/configuration.ts';
import { fixtureInputSchema } from '../../../shared/schemas/fixture.ts';
import { frictionTestInputSchema } from '../../../shared/schemas/frictionTest.ts';
import { fileNameSchema } from '../../../shared/schemas/trialLog.ts';
import { verdicts } from '../../../shared/schemas/verdict.ts';
import type { AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { analyseDemo, readDemoLog, readDemoLogs } from './analyseDemo.ts';

const scenario = demoScenario();
const results = new Map(scenario.map((demo) => [demo.fixture.code, analyseDemo(demo)]));

function demoOf(code: string): DemoFixture {
  const demo = scenario.find(({ fixture }) => fixture.code === code);
  if (!demo) throw new Error(`no fixture ${code}`);
  return demo;
}

function resultOf(code: string): AnalysisResult {
  const result = results.get(code);
  if (!result) throw new Error(`no fixture ${code}`);
  return result;
}

function verdictsOf({ configurations }: AnalysisResult): Record<string, string> {
  return Object.fromEntries(configurations.map(({ label, verdict }) => [label, verdict]));
}

describe('the demo scenario', () => {
  it('has at least eight fixtures on several lines and 600 trials', () => {
    expect(scenario.length).toBeGreaterThanOrEqual(8);
    expect(new Set(scenario.map(({ fixture }) => fixture.line)).size).toBeGreaterThanOrEqual(3);
    const trials = [...results.values()].reduce((sum, { counts }) => sum + counts.trials, 0);
    expect(trials).toBeGreaterThanOrEqual(600);
  });

  it('is the same at every call', () => {
    expect(demoScenario()).toEqual(scenario);
    expect(messyLog()).toEqual(messyLog());
  });

  it('holds only what the wire accepts, each code and file name once', () => {
    for (const demo of scenario) {
      fixtureInputSchema.parse(demo.fixture);
      buildUpInputSchema.parse({ ...demo.buildUp, version: 1 });
      for (const configuration of demo.configurations)
        configurationInputSchema.parse(configuration);
      for (const test of demo.frictionTests) frictionTestInputSchema.parse(test);
      for (const { fileName } of demo.logs) fileNameSchema.parse(fileName);
      expect(demo.fixture.remark).toMatch(/invented/);
    }
    const names = scenario.flatMap(({ logs }) => logs.map(({ fileName }) => fileName));
    const codes = scenario.map(({ fixture }) => fixture.code);
    expect(new Set(names).size).toBe(names.length);
    expect(new Set(codes).size).toBe(codes.length);
  });

  it.each(scenario.map((demo) => [demo.fixture.code, demo] as const))(
    'has logs of %s that are read without a refused or odd row',
    (_code, demo) => {
      for (const { problems, oddities, rows } of readDemoLogs(demo)) {
        expect(problems).toEqual([]);
        expect(oddities).toEqual([]);
        expect(rows.length).toBeGreaterThan(0);
      }
    },
  );

  it('shows every verdict there is, as the verdict of some configuration', () => {
    const found = [...results.values()].flatMap((result) => Object.values(verdictsOf(result)));
    expect([...new Set(found)].sort()).toEqual([...verdicts].sort());
  });

  it('has more configurations in line than not', () => {
    const all = [...results.values()].flatMap(({ configurations }) => configurations);
    const inLine = all.filter(({ verdict }) => verdict === 'in line');
    expect(inLine.length).toBeGreaterThan(all.length / 2);
  });

  it('lets one position of TT-2 slip early and leaves the others in line', () => {
    expect(verdictsOf(resultOf('TT-2'))).toEqual({
      '20 mm': 'in line',
      '45 mm': 'in line',
      '70 mm': 'slips early',
      '95 mm': 'in line',
      '120 mm': 'in line',
    });
    const { ratio } = resultOf('TT-2').configurations.find(({ label }) => label === '70 mm')!.shape;
    // drawn with ×0.79
    expect(ratio).toBeGreaterThan(0.72);
    expect(ratio).toBeLessThan(0.87);
  });

  it('finds the coefficients the trials were drawn from', () => {
    for (const [code, mu] of [
      ['TT-2', 0.334],
      ['PX-1', 0.265],
      ['HF-5', 0.36],
      ['LT-3', 0.34],
      ['CT-6', 0.37],
    ] as const) {
      const { lower, upper } = resultOf(code).mu50;
      expect(lower).toBeLessThan(mu);
      expect(upper).toBeGreaterThan(mu);
    }
  });

  it('has a set with complete separation', () => {
    expect(resultOf('CN-12').separation.overall).toBe('complete');
  });

  it('has a configuration where everything held', () => {
    const outermost = resultOf('VN-4').configurations.find(({ label }) => label === '105 mm');
    expect(outermost?.slips).toBe(0);
    expect(outermost?.trials).toBeGreaterThan(0);
  });

  it('has glazing pads: the grip falls over the run order', () => {
    const { change, p } = resultOf('IM-4').diagnostics.drift;
    expect(change).toBeLessThan(0.85);
    expect(p).toBeLessThan(0.001);
    const batches = readDemoLogs(demoOf('IM-4')).flatMap(({ rows }) =>
      rows.map(({ batch }) => batch),
    );
    expect(new Set(batches)).toEqual(new Set(['K-07', 'K-08']));
  });
});

describe('the messy log', () => {
  const { fixtureCode, bytes, fileName } = messyLog();
  const demo = demoOf(fixtureCode);
  const messy = readDemoLog(demo, bytes);

  it('is not among the logs of its fixture', () => {
    expect(demo.logs.map((log) => log.fileName)).not.toContain(fileName);
  });

  it('has nine rows refused, each with row, column or value and remedy, and one odd row', () => {
    expect(messy.refusal).toBeNull();
    expect(messy.mapping).toMatchObject({
      encoding: 'windows-1252',
      delimiter: ';',
      decimal: ',',
      headerLine: 5,
      units: { position: 'cm', acceleration: 'deg/s²' },
    });
    expect(messy.problems).toHaveLength(9);
    for (const { row, column, reason } of messy.problems) {
      expect(row).toBeGreaterThan(5);
      expect(column).not.toBeNull();
      expect(reason).toMatch(/:/);
    }
    const odd = messy.oddities.filter(({ row }) => row > 0);
    expect(odd.map(({ reason }) => reason)).toEqual([
      expect.stringMatching(/beyond what the drive/),
    ]);
  });

  it('turns its fixture from not shown to slips early at 75 mm and in line elsewhere', () => {
    expect(new Set(Object.values(verdictsOf(resultOf(fixtureCode))))).toEqual(
      new Set(['not shown']),
    );
    expect(verdictsOf(analyseDemo(demo, [...readDemoLogs(demo), messy]))).toEqual({
      '25 mm': 'in line',
      '50 mm': 'in line',
      '75 mm': 'slips early',
      '100 mm': 'in line',
    });
  });
});
