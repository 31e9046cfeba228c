import { Link } from 'react-router';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { MarkGlyph } from '../../charts/MarkGlyph.tsx';
import { outcomeMarks } from '../../charts/outcomeMarks.ts';

interface ColumnTrialsProps {
  fixtureId: number;
  label: string;
  trials: readonly Trial[];
  /** the trial whose mark was clicked in the map */
  marked: string | null;
}

/** The chosen configuration's trials, fastest first: the map's column for the keyboard. */
export function ColumnTrials({ fixtureId, label, trials, marked }: ColumnTrialsProps) {
  const column = trials
    .filter(({ configuration }) => configuration === label)
    .sort((a, b) => b.acceleration - a.acceleration);
  return (
    <details className="border-t border-line" open={column.some(({ id }) => String(id) === marked)}>
      <summary className="cursor-pointer px-3 py-2 text-sm font-bold hover:bg-hover">
        The {column.length} trials at {label}
      </summary>
      <ol
        tabIndex={0}
        aria-label={`Trials at ${label}, fastest first`}
        className="max-h-72 list-none overflow-y-auto border-t border-line px-3 py-1 text-sm"
      >
        {column.map((trial) => {
          const { symbol, excludedSymbol, textClass, word } = outcomeMarks[trial.outcome];
          return (
            <li
              key={trial.id}
              aria-current={String(trial.id) === marked ? 'true' : undefined}
              className="flex flex-wrap items-baseline gap-x-3 py-0.5 aria-[current]:bg-chosen"
            >
              <span className="w-16 text-right tabular-nums">
                {formatQuantity(trial.acceleration)}
              </span>
              <span className={trial.excluded ? 'text-muted line-through' : ''}>
                <MarkGlyph
                  shape={trial.excluded ? excludedSymbol : symbol}
                  className={trial.excluded ? '' : textClass}
                />{' '}
                {word}
              </span>
              <Link
                to={`/fixtures/${fixtureId}/trials?log=${trial.logId}&configuration=${encodeURIComponent(label)}`}
              >
                row {trial.row}
              </Link>
              {trial.excluded && (
                <span className="text-muted">excluded: {trial.excludedReason}</span>
              )}
            </li>
          );
        })}
      </ol>
      <p className="px-3 pb-2 text-sm text-muted">Acceleration in rad/s².</p>
    </details>
  );
}
