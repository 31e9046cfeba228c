import { type OverviewRow } from '../../../shared/schemas/overview.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';

/** Parts per hour at the working limit, and what that costs against theory: `1 412`, `−6 %`. */
export function partsChange({ partsPerHour }: OverviewRow): { rate: string; change: string } {
  const { theory, limit } = partsPerHour ?? { theory: 0, limit: null };
  if (limit === null) return { rate: '–', change: '–' };
  const change = (100 * (limit - theory)) / theory;
  return {
    rate: formatQuantity(limit, { decimals: 0 }),
    change: `${formatQuantity(change, { decimals: Math.abs(change) < 10 ? 1 : 0 })} %`,
  };
}
