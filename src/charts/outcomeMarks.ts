import { type MarkShape } from './drawing.ts';
import { type Outcome } from '../../shared/schemas/trial.ts';
import { type ChartTheme } from './chartTheme.ts';

/** How an outcome is drawn: never by colour alone, each has its own shape. */
export interface OutcomeMark {
  word: string;
  symbol: MarkShape;
  excludedSymbol: MarkShape;
  color: (theme: ChartTheme) => string;
  /** the same colour as a class, written out so that it is found and kept */
  textClass: string;
}

export const outcomeMarks: Record<Outcome, OutcomeMark> = {
  held: {
    word: 'held',
    symbol: 'circle-open',
    excludedSymbol: 'circle-open-dot',
    color: (theme) => theme.held,
    textClass: 'text-held',
  },
  slipped: {
    word: 'slipped',
    symbol: 'diamond',
    excludedSymbol: 'diamond-open-dot',
    color: (theme) => theme.slipped,
    textClass: 'text-slipped',
  },
  lost: {
    word: 'lost',
    symbol: 'x-thin',
    excludedSymbol: 'x-open-dot',
    color: (theme) => theme.lost,
    textClass: 'text-lost',
  },
};
