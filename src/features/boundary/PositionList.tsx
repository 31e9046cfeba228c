import { Link } from 'react-router';
import {
  type Boundary,
  type ConfigurationResult,
  type Interval,
} from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatRange } from '../../charts/formatRange.ts';
import { VerdictWord } from '../../charts/VerdictWord.tsx';
import { judgedAlpha50 } from './mapSceneOf.ts';

interface PositionListProps {
  configurations: readonly ConfigurationResult[];
  positions: Boundary['positions'];
  commonTorque50: Interval;
  chosen: string | null;
  linkTo: (label: string) => string;
}

/** What limits a configuration, as a word of the list. */
const bindWords = { theory: 'theory', demonstrated: 'trials', drive: 'drive' } as const;

/** One line a configuration, in the order of the slide; choosing one moves the whole screen to it. */
export function PositionList(props: PositionListProps) {
  const { configurations, positions, commonTorque50, chosen, linkTo } = props;
  const place = new Map(positions.map(({ label, positionMm }) => [label, positionMm]));
  const sorted = [...configurations].sort(
    (a, b) => (place.get(a.label) ?? 0) - (place.get(b.label) ?? 0),
  );
  return (
    <ul className="divide-y divide-line">
      {sorted.map((one) => (
        <li key={one.label}>
          <Link
            to={linkTo(one.label)}
            replace
            preventScrollReset
            aria-current={one.label === chosen ? 'true' : undefined}
            className="block px-3 py-2 no-underline hover:bg-hover aria-[current]:bg-chosen aria-[current]:shadow-[inset_3px_0_0_var(--color-accent)]"
          >
            <span className="flex flex-wrap items-baseline justify-between gap-x-3">
              <span className="font-bold text-ink">{one.label}</span>
              <VerdictWord verdict={one.verdict} />
            </span>
            <Line name="half slip at" value={formatRange(judgedAlpha50(one, commonTorque50))} />
            <Line
              name="demonstrated"
              value={formatQuantity(one.demonstrated, { rounding: 'down' })}
            />
            <Line
              name={
                one.binds === null ? 'working limit' : `working limit, by ${bindWords[one.binds]}`
              }
              value={formatQuantity(one.workingLimit, { rounding: 'down' })}
              strong
            />
          </Link>
        </li>
      ))}
    </ul>
  );
}

function Line({ name, value, strong = false }: { name: string; value: string; strong?: boolean }) {
  return (
    <span className="flex justify-between gap-3 text-sm">
      <span className="text-muted">{name}</span>
      <span className={`tabular-nums ${strong ? 'font-bold text-accent' : 'text-ink'}`}>
        {value}
      </span>
    </span>
  );
}
