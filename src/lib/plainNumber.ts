/** A number as it was entered: no digits added, none hidden beyond the sixth. */
export function plainNumber(value: number): string {
  return String(Number(value.toPrecision(6))).replace('-', '−');
}
