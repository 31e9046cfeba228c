import { type Verdict } from '../../shared/schemas/verdict.ts';
import { MarkGlyph } from './MarkGlyph.tsx';
import { verdictMarks } from './verdictMarks.ts';

const tones: Record<Verdict, string> = {
  breached: 'text-lost',
  'slips early': 'text-lost',
  early: 'text-lost',
  'no common curve': 'text-lost',
  'not shown': 'text-slipped',
  undecided: 'text-slipped',
  'not checked': 'text-muted',
  'holds longer': 'text-held',
  late: 'text-held',
  'in line': 'text-held',
};

/** A verdict as a word with the shape it has in the pictures; colour only repeats it. */
export function VerdictMark({ verdict, className = '' }: { verdict: Verdict; className?: string }) {
  return (
    <span
      className={`inline-flex items-center gap-1.5 font-bold whitespace-nowrap text-ink ${className}`}
    >
      <MarkGlyph shape={verdictMarks[verdict].symbol} className={tones[verdict]} />
      {verdict}
    </span>
  );
}
