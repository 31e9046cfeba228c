import type { AnalysisResult } from '../../shared/schemas/analysis.ts';
import type { Verdict } from '../../shared/schemas/verdict.ts';

const urgent: readonly Verdict[] = ['breached', 'slips early', 'early', 'no common curve'];

type Judged = { code: string; verdict: Verdict; result: AnalysisResult | null };

/** One sentence: which fixtures need a decision, and why. */
export function needsAttention(fixtures: Judged[]): string {
  if (fixtures.length === 0) return 'There is no fixture yet.';
  const waiting = fixtures.filter((fixture) => urgent.includes(fixture.verdict));
  if (waiting.length === 0) return 'No fixture disagrees with theory or breaches its margin.';
  const one = waiting.length === 1;
  const named = waiting.slice(0, 3).map(reasonOf);
  const more = waiting.length > 3 ? ` · and ${waiting.length - 3} more` : '';
  return `${waiting.length} ${one ? 'fixture needs' : 'fixtures need'} you: ${named.join(' · ')}${more}.`;
}

function reasonOf({ code, verdict, result }: Judged): string {
  if (verdict === 'no common curve') return `${code} has no common curve`;
  const labels =
    result?.configurations.filter((one) => one.verdict === verdict).map((one) => one.label) ?? [];
  const where = labels.length > 0 ? ` at ${labels.join(', ')}` : '';
  if (verdict === 'breached') return `${code} breaches its margin${where}`;
  return `${code} ${verdict === 'early' ? 'is early' : 'slips early'}${where}`;
}
