import { type Interval } from '../../shared/schemas/analysis.ts';
import { formatPlain } from './formatPlain.ts';

/** `9.1 (8.6–9.7)`; an open end is an ellipsis, no estimate is a dash. */
export function formatRange({ estimate, lower, upper }: Interval): string {
  const middle = estimate === null ? '–' : formatPlain(estimate);
  if (lower === null && upper === null) return middle;
  return `${middle} (${lower === null ? '…' : formatPlain(lower)}–${upper === null ? '…' : formatPlain(upper)})`;
}
