/** Three significant digits, as people write them: 9.1, 0.0526, 1240. */
export function digits(value: number, significant = 3): string {
  if (value === 0) return '0';
  const size = Math.floor(Math.log10(Math.abs(value)));
  if (size >= 7 || size < -4) return value.toExponential(significant - 1);
  const rounded = Number(value.toPrecision(significant));
  const decimals = Math.max(0, significant - 1 - Math.floor(Math.log10(Math.abs(rounded))));
  return rounded.toFixed(decimals);
}

/** An acceleration with its unit. */
export function acceleration(value: number): string {
  return `${digits(value)} rad/s²`;
}

/** "8.6–9.7", "8.6 or more", "9.7 or less", "not bounded". */
export function range(lower: number | null, upper: number | null): string {
  if (lower !== null && upper !== null) return `${digits(lower)}–${digits(upper)}`;
  if (lower !== null) return `${digits(lower)} or more`;
  if (upper !== null) return `${digits(upper)} or less`;
  return 'not bounded by these trials';
}

export function percent(share: number): string {
  return `${digits(100 * share, 2).replace(/\.0$/, '')} %`;
}

/** "1 trial", "6 trials". */
export function count(n: number, one: string, many = `${one}s`): string {
  return `${n} ${n === 1 ? one : many}`;
}
