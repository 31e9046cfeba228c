import type { DemoFixture } from '../../../server/demo/scenario.ts';
import { analyse } from '../../../shared/analyse.ts';
import { readLog, type LogReading } from '../../../shared/intake/readLog.ts';
import { fixtureTheory } from '../../../shared/physics/fixtureTheory.ts';
import { analysisRequestSchema, type AnalysisResult } from '../../../shared/schemas/analysis.ts';

/** Reads a log for a demo fixture the way an upload would. */
export function readDemoLog(demo: DemoFixture, bytes: Uint8Array): LogReading {
  const context = {
    configurations: demo.configurations.map(({ label, positionMm }, index) => ({
      id: index + 1,
      label,
      positionMm,
    })),
    slide: demo.buildUp.slide,
    maxAcceleration: demo.fixture.drive.maxAcceleration,
  };
  return readLog(bytes, {}, context);
}

/** Reads the logs that the demo holds of a fixture. */
export function readDemoLogs(demo: DemoFixture): LogReading[] {
  return demo.logs.map(({ text }) => readDemoLog(demo, new TextEncoder().encode(text)));
}

/** Analyses a demo fixture at default options, from its logs and its theory. */
export function analyseDemo(demo: DemoFixture, logs = readDemoLogs(demo)): AnalysisResult {
  const theory = fixtureTheory(demo.fixture, demo.buildUp, demo.configurations, demo.frictionTests);
  const byLabel = new Map(theory.configurations.map((one) => [one.label, one]));
  const trials = logs.flatMap(({ rows }) =>
    rows.map((row) => ({
      configuration: row.configuration,
      inertia: byLabel.get(row.configuration)?.inertia,
      acceleration: row.acceleration,
      outcome: row.outcome,
      ...(row.order !== null && { order: row.order }),
      ...(row.batch !== null && { batch: row.batch }),
      ...(row.seating !== null && { seating: row.seating }),
      ...(row.slipAngle !== null && { slipAngle: row.slipAngle }),
      ...(row.judgedBy !== null && { judgedBy: row.judgedBy }),
    })),
  );
  return analyse(
    analysisRequestSchema.parse({
      trials,
      torquePerMu: Object.fromEntries(
        theory.configurations.map(({ label, torquePerMu }) => [label, torquePerMu]),
      ),
      inertiaRelativeUncertainty: Object.fromEntries(
        theory.configurations.map((one) => [one.label, one.inertiaRelativeUncertainty]),
      ),
      moveAngle: theory.moveAngle,
      drive: theory.drive,
      friction: theory.friction,
    }),
  );
}
