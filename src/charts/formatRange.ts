import { type Interval } from '../../shared/schemas/analysis.ts';
import { formatColumn } from '../../shared/units/formatQuantity.ts';

/** `9.1 (8.6–9.7)`; an open end is an ellipsis, no estimate is a dash. */
export function formatRange({ estimate, lower, upper }: Interval): string {
  const [middle = '–', from = '–', to = '–'] = formatColumn([estimate, lower, upper]);
  if (lower === null && upper === null) return middle;
  return `${middle} (${lower === null ? '… ' : from}–${upper === null ? ' …' : to})`;
}
