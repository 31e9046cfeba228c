import type { Verdict } from '../../shared/schemas/verdict.ts';
import { MarkGlyph } from './MarkGlyph.tsx';
import { verdictMarks } from './verdictMarks.ts';

const glyphTones: Record<Verdict, string> = {
  breached: 'text-lost',
  'slips early': 'text-lost',
  early: 'text-lost',
  'no common curve': 'text-lost',
  'not shown': 'text-slipped',
  undecided: 'text-slipped',
  'not checked': 'text-muted',
  'holds longer': 'text-accent',
  late: 'text-accent',
  'in line': 'text-accent',
};

const bad: ReadonlySet<Verdict> = new Set(['breached', 'slips early', 'early', 'no common curve']);

/** A verdict as everywhere: its word, and the shape it has in the pictures. */
export function VerdictWord({ verdict }: { verdict: Verdict }) {
  return (
    <span className={`whitespace-nowrap ${bad.has(verdict) ? 'font-bold text-lost' : 'text-ink'}`}>
      <MarkGlyph shape={verdictMarks[verdict].symbol} className={glyphTones[verdict]} /> {verdict}
    </span>
  );
}
