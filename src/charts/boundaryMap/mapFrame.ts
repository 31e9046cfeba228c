import { type MapConfiguration, type MapScene } from './mapScene.ts';

/** One configuration where it stands. */
export interface MapColumn extends MapConfiguration {
  x: number;
}

/** The axes' extent and the columns, from the scene alone. */
export interface MapFrame {
  columns: MapColumn[];
  xLog: boolean;
  yLog: boolean;
  x: [number, number];
  y: [number, number];
  /** half of the room a column may take, on the drawn scale of x (log₁₀ where xLog) */
  halfColumn: number;
}

/** How far above the highest mark the drive limit may lie and still be drawn. */
const driveLimitReach = 1.6;

/**
 * @throws RangeError if there is nothing to draw: no configuration that has a place in this view
 */
export function mapFrame(scene: MapScene): MapFrame {
  const columns = scene.configurations.flatMap((configuration): MapColumn[] => {
    const x = scene.view === 'inertia' ? configuration.inertia : configuration.positionMm;
    return x === null ? [] : [{ ...configuration, x }];
  });
  columns.sort((a, b) => a.x - b.x);
  if (columns.length === 0) throw new RangeError('the map needs at least one configuration');
  const xLog = scene.view === 'inertia' && scene.scale === 'log';
  const yLog = scene.scale === 'log';
  const drawn = columns.map(({ x }) => (xLog ? Math.log10(x) : x));
  return {
    columns,
    xLog,
    yLog,
    x: xExtent(drawn, xLog, scene.view),
    y: yExtent(scene, columns, yLog),
    halfColumn: halfColumn(drawn),
  };
}

function xExtent(
  drawn: readonly number[],
  xLog: boolean,
  view: MapScene['view'],
): [number, number] {
  const from = Math.min(...drawn);
  const to = Math.max(...drawn);
  const alone = xLog ? 0.1 : Math.max(Math.abs(to) * 0.2, view === 'position' ? 5 : 0);
  const room = to > from ? (to - from) * 0.12 : alone;
  const low = view === 'inertia' && !xLog ? Math.max(from - room, 0) : from - room;
  return xLog ? [10 ** low, 10 ** (to + room)] : [low, to + room];
}

function yExtent(scene: MapScene, columns: readonly MapColumn[], yLog: boolean): [number, number] {
  const labels = new Set(columns.map(({ label }) => label));
  const heights = scene.trials
    .filter((trial) => labels.has(trial.configuration))
    .map((trial) => trial.acceleration);
  for (const { inertia, alpha50, holding, lettingGo, workingLimit } of columns) {
    const limit = scene.limitTorque === null ? null : scene.limitTorque / inertia;
    for (const height of [alpha50.estimate, holding, lettingGo, workingLimit, limit]) {
      if (height !== null && height > 0) heights.push(height);
    }
  }
  if (heights.length === 0) heights.push(1);
  let high = heights.reduce((a, b) => Math.max(a, b));
  const low = heights.reduce((a, b) => Math.min(a, b));
  if (scene.driveLimit !== null && scene.driveLimit <= high * driveLimitReach) {
    high = Math.max(high, scene.driveLimit);
  }
  if (!yLog) return [0, high * 1.1];
  const room = Math.max((high / low) ** 0.08, 1.08);
  return [low / room, high * room];
}

function halfColumn(drawn: readonly number[]): number {
  let gap = Number.POSITIVE_INFINITY;
  for (let i = 1; i < drawn.length; i += 1) {
    const step = (drawn[i] ?? 0) - (drawn[i - 1] ?? 0);
    if (step > 0) gap = Math.min(gap, step);
  }
  const alone = Math.max(Math.abs(drawn[0] ?? 1) * 0.05, 0.02);
  return 0.38 * (Number.isFinite(gap) ? gap : alone);
}

/** Evenly drawn places along x, ends included. */
export function alongX(frame: MapFrame, count = 81): number[] {
  const [from, to] = frame.x;
  return Array.from({ length: count }, (_, i) => {
    const share = i / (count - 1);
    return frame.xLog ? from * (to / from) ** share : from + (to - from) * share;
  });
}
