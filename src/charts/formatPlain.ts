/** Three significant digits without an exponent: 12.604918 → 12.6, 1412.3 → 1 412. */
export function formatPlain(value: number, digits = 3): string {
  if (value === 0) return '0';
  const exponent = Math.floor(Math.log10(Math.abs(Number(value.toPrecision(digits)))));
  const decimals = Math.min(Math.max(digits - 1 - exponent, 0), 12);
  const [whole = '', fraction] = Math.abs(value).toFixed(decimals).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, '\u2009');
  return `${value < 0 ? '−' : ''}${grouped}${fraction === undefined ? '' : `.${fraction}`}`;
}
