import type { AnalysisRequest, ConfigurationResult } from '../schemas/analysis.ts';
import type { Verdict } from '../schemas/verdict.ts';
import type { ConfigurationFit } from '../boundary/fitBoundary.ts';
import { successRun } from '../numeric/distributions.ts';
import { acceleration, count, digits, percent, range } from './text.ts';

/** What a sentence may name. */
export interface SentenceFacts {
  label: string;
  verdict: Verdict;
  fit: ConfigurationFit;
  theory: ConfigurationResult['theory'];
  shape: ConfigurationResult['shape'];
  level: ConfigurationResult['level'];
  margin: ConfigurationResult['margin'];
  demonstrated: number | null;
  slips: number;
  trials: number;
  highestHeld: number | null;
  lowestSlipped: number | null;
}

type Options = Pick<AnalysisRequest, 'target' | 'confidence'>;

function letsGo({ fit: { level50 } }: SentenceFacts): string {
  const { estimate, lower, upper } = level50;
  if (estimate === null) return `where it lets go is not known (α₅₀ ${range(lower, upper)})`;
  return `it lets go at ${acceleration(estimate)} (${range(lower, upper)})`;
}

function times({ shape: { ratio, lower, upper } }: SentenceFacts): string {
  const interval = lower === null && upper === null ? '' : ` (${range(lower, upper)})`;
  return ratio === null
    ? `a torque ratio of ${range(lower, upper)}`
    : `×${digits(ratio, 2)}${interval}`;
}

function slipsAt({ margin }: SentenceFacts): string {
  return `${margin.slipsAtOrBelow === 0 ? 'no slip' : count(margin.slipsAtOrBelow, 'slip')} in ${count(margin.trialsAtOrBelow, 'trial')} at or below ${acceleration(margin.judged ?? 0)}`;
}

function toTheLimit(facts: SentenceFacts): string {
  return facts.demonstrated === null
    ? 'These trials demonstrate no limit yet.'
    : `These trials demonstrate ${acceleration(facts.demonstrated)}.`;
}

function near({ fit: { level50 }, lowestSlipped, highestHeld }: SentenceFacts): string {
  const at = level50.estimate ?? lowestSlipped ?? highestHeld;
  return at === null ? '' : ` near ${acceleration(at)}`;
}

/** One plain sentence or two: the numbers the verdict rests on, and what to do next. */
export function sentenceOf(facts: SentenceFacts, options: Options): string {
  const { label, theory, level, margin, fit } = facts;
  const target = percent(options.target);
  switch (facts.verdict) {
    case 'breached': {
      const { upper } = fit.target;
      const below = upper !== null && margin.judged !== null && upper < margin.judged;
      const why = below
        ? `${target} already slip at ${acceleration(upper)} at most, the limit is ${acceleration(margin.judged!)}`
        : `${slipsAt(facts)}, where ${target} may slip`;
      return `${label} is breached: ${why}. Lower the limit before the next run. ${toTheLimit(facts)}`;
    }
    case 'slips early':
      return `${label} slips early: ${letsGo(facts)}, below the holding bound of ${acceleration(Math.min(theory.holding ?? Infinity, theory.lettingGo ?? Infinity))}. Look at seat and pads there, then run 6 trials${near(facts)}.`;
    case 'early':
      return `${label} is early: it carries ${times(facts)} of the torque of the others. Look at the pad seating there, then run 6 trials${near(facts)}.`;
    case 'no common curve':
      return `${label} is judged by itself: the configurations do not share one curve, and the trials cannot say which one is off. Here ${letsGo(facts)}. Compare seating and build-up of all of them.`;
    case 'not shown': {
      const slip = margin.slipsAtOrBelow > 0 ? `${slipsAt(facts)}; ` : '';
      const { lower } = fit.target;
      const known =
        lower === null
          ? `where ${target} slip has no lower bound yet`
          : `${target} slip at ${acceleration(lower)} or above`;
      const proof = successRun(options.confidence, 1 - options.target);
      return `${label} does not show its limit of ${acceleration(margin.judged ?? 0)}: ${slip}${known}. Lower the limit, or run more trials${near(facts)}; ${count(proof, 'trial')} at the limit without a slip would prove it by themselves. ${toTheLimit(facts)}`;
    }
    case 'undecided':
      return `${label} is undecided: ${letsGo(facts)}. ${level.reason}`;
    case 'not checked': {
      const missing = [
        level.state === 'not checked'
          ? 'theory (that needs the seat torque and friction tests)'
          : '',
        margin.state === 'not checked'
          ? 'the margin (that needs a working limit or kinetic friction tests)'
          : '',
      ].filter(Boolean);
      return `${label}: ${letsGo(facts)}. Not checked against ${missing.join(' and ')}.`;
    }
    case 'holds longer':
      return `${label} holds longer than theory: ${letsGo(facts)}, above the letting-go bound of ${acceleration(theory.lettingGo ?? 0)}. Look at friction tests and build-up before using the reserve.`;
    case 'late':
      return `${label} is late: it carries ${times(facts)} of the torque of the others. Look at what holds better there before relying on it.`;
    case 'in line':
      return `${label} is in line: ${letsGo(facts)}, theory says ${range(theory.holding, theory.lettingGo)}; the limit of ${acceleration(margin.judged ?? 0)} is shown ${margin.trialsAtOrBelow === 0 ? '(from the curve; no trial lies that low)' : `(${slipsAt(facts)})`}.`;
  }
}

/** The fixture's sentence: who is off, or that none is. */
export function fixtureSentence(
  verdict: Verdict,
  configurations: readonly { label: string; verdict: Verdict; sentence: string }[],
  facts: {
    torqueChanges: { exponent: number | null } | null;
    mu50: { estimate: number | null; lower: number | null; upper: number | null };
    heterogeneity: { factor: number; between: string | null };
  },
): string {
  const concerned = configurations.filter((c) => c.verdict === verdict);
  const parts: string[] = [];
  if (facts.torqueChanges) {
    const { exponent } = facts.torqueChanges;
    const size = exponent === null ? '' : ` (exponent ${digits(exponent, 2)} where theory says 1)`;
    parts.push(`The torque changes along the positions${size}; no single one is to blame.`);
  }
  if (configurations.length === 1) parts.push(configurations[0].sentence);
  else if (verdict === 'in line')
    parts.push(`All ${configurations.length} configurations are in line.`);
  else if (verdict === 'no common curve') {
    parts.push(
      `${concerned.map((c) => c.label).join(', ')} do not share one curve, and the trials cannot say which one is off: each is judged by itself. Compare seating and build-up of all of them.`,
    );
  } else if (concerned.length === configurations.length) {
    parts.push(`All ${concerned.length} configurations: ${verdict}.`, concerned[0].sentence);
  } else if (concerned.length === 1) {
    parts.push(concerned[0].sentence);
  } else {
    parts.push(`${concerned.map((c) => c.label).join(', ')}: ${verdict}.`, concerned[0].sentence);
  }
  const { estimate, lower, upper } = facts.mu50;
  if (estimate !== null) parts.push(`Fitted μ ${digits(estimate)} (${range(lower, upper)}).`);
  if (facts.heterogeneity.factor > 1) {
    parts.push(
      `The trials scatter ${digits(facts.heterogeneity.factor, 2)} times more between ${facts.heterogeneity.between ?? 'levels'} than chance allows; the intervals are widened for it.`,
    );
  }
  return parts.join(' ');
}
