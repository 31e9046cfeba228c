import { outcomes } from '../../shared/schemas/trial.ts';
import { MarkGlyph } from './MarkGlyph.tsx';
import { outcomeMarks } from './outcomeMarks.ts';

const lines = {
  theory: {
    title: 'theory: holding to letting-go bound',
    dash: '5 3',
    className: 'text-ink',
    width: 1.5,
  },
  fitted: {
    title: 'fitted: half slip, with its interval',
    dash: undefined,
    className: 'text-ink',
    width: 2,
  },
  limit: {
    title: 'working limit: line between positions, bar at one',
    dash: undefined,
    className: 'text-accent',
    width: 3,
  },
  drive: { title: 'drive limit', dash: '2 3', className: 'text-muted', width: 1.5 },
} as const;

export type KeyLine = keyof typeof lines;

/** What the marks and lines of a map mean; only those that are in it. */
export function MapKey({
  drawn,
  excluded,
  fits = [],
}: {
  drawn: readonly KeyLine[];
  excluded: boolean;
  /** marks of the configurations' own fits that are in the picture */
  fits?: readonly ('fitted' | 'set apart')[];
}) {
  return (
    <ul
      aria-label="Key to the picture"
      className="mt-1 flex list-none flex-wrap gap-x-4 gap-y-1 p-0 text-sm text-muted"
    >
      {outcomes.map((outcome) => (
        <li key={outcome}>
          <MarkGlyph
            shape={outcomeMarks[outcome].symbol}
            className={outcomeMarks[outcome].textClass}
          />{' '}
          {outcomeMarks[outcome].word}
        </li>
      ))}
      {excluded && (
        <li>
          <MarkGlyph shape="circle-open-dot" /> excluded, with a dot
        </li>
      )}
      {fits.includes('fitted') && (
        <li>
          <MarkGlyph shape="square" className="text-ink" /> half slip at one position, own fit
        </li>
      )}
      {fits.includes('set apart') && (
        <li>
          <MarkGlyph shape="star" className="text-ink" /> the same, set apart from the common curve
        </li>
      )}
      {drawn.map((name) => (
        <li key={name} className="whitespace-nowrap">
          <svg
            viewBox="0 0 24 8"
            aria-hidden="true"
            className={`inline-block h-2 w-6 ${lines[name].className}`}
          >
            <path
              d="M0 4h24"
              stroke="currentColor"
              strokeWidth={lines[name].width}
              strokeDasharray={lines[name].dash}
            />
          </svg>{' '}
          {lines[name].title}
        </li>
      ))}
    </ul>
  );
}
