import { type MarkShape } from './drawing.ts';
import { type Verdict } from '../../shared/schemas/verdict.ts';
import { type ChartTheme } from './chartTheme.ts';

/** How a verdict is drawn in a picture: the shape says it, the colour repeats it. */
export interface VerdictMark {
  symbol: MarkShape;
  color: (theme: ChartTheme) => string;
}

const bad = (theme: ChartTheme) => theme.lost;
const doubt = (theme: ChartTheme) => theme.slipped;
const quiet = (theme: ChartTheme) => theme.muted;
const good = (theme: ChartTheme) => theme.held;

export const verdictMarks: Record<Verdict, VerdictMark> = {
  breached: { symbol: 'x', color: bad },
  'slips early': { symbol: 'triangle-down', color: bad },
  early: { symbol: 'triangle-down-open', color: bad },
  'no common curve': { symbol: 'asterisk-open', color: bad },
  'not shown': { symbol: 'square-open', color: doubt },
  undecided: { symbol: 'diamond-open', color: doubt },
  'not checked': { symbol: 'circle-open-dot', color: quiet },
  'holds longer': { symbol: 'triangle-up', color: good },
  late: { symbol: 'triangle-up-open', color: good },
  'in line': { symbol: 'circle', color: good },
};
