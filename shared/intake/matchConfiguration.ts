/** A configuration as the intake knows it; id null while it is only proposed by this log. */
export type KnownConfiguration = { id: number | null; label: string; positionMm: number };

export type SlideRange = { minMm: number; maxMm: number };

export type Match =
  | { ok: true; configuration: KnownConfiguration; note: string | null }
  | { ok: false; column: 'configuration' | 'position'; reason: string };

/**
 * Positions closer than this are the same: what a scale on the slide resolves, and far below what
 * changes an inertia.
 */
const positionToleranceMm = 0.05;

const room = positionToleranceMm * (1 + 1e-9);

/**
 * Finds the configuration of a row by its label, its position, or both (which must then agree).
 * A position inside the slide without a configuration becomes a new one when `add` is set; the
 * new ones are kept in `added`.
 */
export function matchConfiguration(
  { label, positionMm }: { label: string | null; positionMm: number | null },
  known: readonly KnownConfiguration[],
  added: KnownConfiguration[],
  { slide, add }: { slide: SlideRange | null; add: boolean },
): Match {
  const all = [...known, ...added];
  const named = label === null ? undefined : all.find((one) => sameLabel(one.label, label));
  if (positionMm === null) {
    if (named) return { ok: true, configuration: named, note: null };
    return {
      ok: false,
      column: 'configuration',
      reason: `is not a configuration of this fixture (${listed(known)}): correct the label, or add the configuration first`,
    };
  }

  const near = nearest(all, positionMm);
  if (named && (!near || named !== near)) {
    return Math.abs(named.positionMm - positionMm) <= room
      ? { ok: true, configuration: named, note: null }
      : {
          ok: false,
          column: 'position',
          reason: `disagrees with configuration “${named.label}”, which is at ${named.positionMm} mm: correct one of them`,
        };
  }
  if (near) {
    const note =
      label !== null && !named
        ? `Configuration “${label}” is not known; the row was taken by its position, ${near.positionMm} mm.`
        : null;
    return { ok: true, configuration: near, note };
  }
  if (slide && (positionMm < slide.minMm - room || positionMm > slide.maxMm + room)) {
    return {
      ok: false,
      column: 'position',
      reason: `is ${positionMm} mm, outside the slide (${slide.minMm} to ${slide.maxMm} mm): correct it, or check the unit of the column`,
    };
  }
  if (!slide) {
    return {
      ok: false,
      column: 'position',
      reason: `is ${positionMm} mm, where this fixture has no configuration (${listed(known)}): add it first`,
    };
  }
  if (!add) {
    return {
      ok: false,
      column: 'position',
      reason: `is ${positionMm} mm, where this fixture has no configuration (${listed(known)}): let the import add new positions, or correct it`,
    };
  }
  const created = { id: null, label: freshLabel(label, positionMm, all), positionMm };
  added.push(created);
  return { ok: true, configuration: created, note: null };
}

function nearest(all: readonly KnownConfiguration[], positionMm: number) {
  let best: KnownConfiguration | undefined;
  for (const one of all) {
    const distance = Math.abs(one.positionMm - positionMm);
    if (distance <= room && (!best || distance < Math.abs(best.positionMm - positionMm)))
      best = one;
  }
  return best;
}

function freshLabel(
  label: string | null,
  positionMm: number,
  all: readonly KnownConfiguration[],
): string {
  const plain = `${Math.round(positionMm * 1000) / 1000} mm`;
  const wanted = label !== null && label.length <= 40 ? label : plain;
  const free = (candidate: string) => !all.some((one) => sameLabel(one.label, candidate));
  if (free(wanted)) return wanted;
  if (free(plain)) return plain;
  let number = 2;
  while (!free(`${plain} (${number})`)) number++;
  return `${plain} (${number})`;
}

/** Whether two labels are one: `70mm`, `70 MM` and ` 70 mm` are. */
export function sameLabel(a: string, b: string): boolean {
  return bare(a) === bare(b);
}

function bare(label: string): string {
  return label.replace(/\s+/g, '').toLowerCase();
}

function listed(known: readonly KnownConfiguration[]): string {
  if (known.length === 0) return 'none yet';
  const labels = known.slice(0, 8).map(({ label }) => label);
  return labels.join(', ') + (known.length > labels.length ? ' …' : '');
}
