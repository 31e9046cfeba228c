/** A share as people write it: 0.01 → `1 %`, 0.393 → `39 %`; no zeros that say nothing, and no line break. */
export function percent(share: number, digits = 2): string {
  return `${Number((100 * share).toPrecision(digits))}\u00A0%`;
}
