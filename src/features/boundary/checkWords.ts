import { type ConfigurationResult } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { percent } from './percent.ts';

/** One of the three checks in plain words: what it asks, what it found, with its numbers. */
export interface CheckWords {
  name: 'Shape' | 'Level' | 'Margin';
  question: string;
  state: string;
  /** how it bears on the verdict: decides the tone, never alone the meaning */
  tone: 'good' | 'doubt' | 'bad' | 'quiet';
  words: string;
}

interface Given {
  tolerance: number;
  confidence: number;
  target: number;
}

/** Shape, level and margin of one configuration, in this order. */
export function checkWords(configuration: ConfigurationResult, options: Given): CheckWords[] {
  return [shape(configuration, options), level(configuration), margin(configuration, options)];
}

function shape({ shape: check }: ConfigurationResult, { tolerance }: Given): CheckWords {
  const ratio =
    check.ratio === null
      ? null
      : `×${formatQuantity(check.ratio, { decimals: 2 })} (${formatEnd(check.lower)}–${formatEnd(check.upper)})`;
  const p = check.p === null ? '' : `, p ${writtenP(check.p)}`;
  const of = 'of the torque the other configurations share';
  const words: Record<typeof check.state, string> = {
    'not applicable':
      'There is one configuration only, so there is no common curve to compare with.',
    early: `It lets go at ${ratio ?? 'less'} ${of}${p}.`,
    late: `It holds to ${ratio ?? 'more'} ${of}${p}.`,
    'no common curve': `The configurations do not share one torque, and no single one explains it${ratio === null ? '' : `: here ${ratio}`}${p}.`,
    'on curve': `It lies on the common curve: ${ratio ?? 'no ratio'}, within ±${percent(tolerance)}.`,
    undecided:
      ratio === null
        ? 'These trials do not say how this configuration compares with the others. This does not count in the verdict.'
        : `${ratio} of the common torque still leaves room beyond ±${percent(tolerance)}. This does not count in the verdict.`,
  };
  const tones = {
    'not applicable': 'quiet',
    early: 'bad',
    late: 'doubt',
    'no common curve': 'bad',
    'on curve': 'good',
    undecided: 'quiet',
  } as const;
  return {
    name: 'Shape',
    question: 'Is it on the common curve?',
    state: check.state,
    tone: tones[check.state],
    words: words[check.state],
  };
}

function level({ level: check, theory }: ConfigurationResult): CheckWords {
  const bounds = [
    theory.holding === null
      ? null
      : `holding bound ${formatQuantity(theory.holding)}${plusMinus(theory.holdingUncertainty)}`,
    theory.lettingGo === null
      ? null
      : `letting-go bound ${formatQuantity(theory.lettingGo)}${plusMinus(theory.lettingGoUncertainty)}`,
  ].filter((bound) => bound !== null);
  const tones = {
    'slips early': 'bad',
    'holds longer': 'doubt',
    'in line': 'good',
    undecided: 'doubt',
    'not checked': 'quiet',
  } as const;
  // a level that is decided against theory names its bound already
  const told = check.state === 'slips early' || check.state === 'holds longer';
  const theoryWords = bounds.length === 0 || told ? '' : ` Theory: ${bounds.join(', ')} rad/s².`;
  return {
    name: 'Level',
    question: 'Does it let go where theory says?',
    state: check.state,
    tone: tones[check.state],
    words: `${sentence(check.reason)}${theoryWords}`.trim(),
  };
}

function margin({ margin: check }: ConfigurationResult, { confidence, target }: Given): CheckWords {
  const tones = {
    breached: 'bad',
    shown: 'good',
    'not shown': 'doubt',
    'not checked': 'quiet',
  } as const;
  return {
    name: 'Margin',
    question: 'Do the trials support the working limit?',
    state: check.state,
    tone: tones[check.state],
    words: marginWords(check, confidence, target),
  };
}

function marginWords(
  {
    judged,
    slipsAtOrBelow: k,
    trialsAtOrBelow: n,
    upperBound,
    state,
  }: ConfigurationResult['margin'],
  confidence: number,
  target: number,
): string {
  if (judged === null) return 'There is no limit to judge yet: test the friction first.';
  const limit = `${formatQuantity(judged)} rad/s²`;
  if (n === 0) {
    return `No trial ran at or below ${limit}, the limit that was judged: it rests on extrapolation only.`;
  }
  const count = `${k === 0 ? 'No slip' : `${k} ${k === 1 ? 'slip' : 'slips'}`} in ${n} ${n === 1 ? 'trial' : 'trials'} at or below ${limit}`;
  const bound =
    upperBound === null
      ? ''
      : `; by the count alone at most ${percent(upperBound)} slip there (${percent(confidence)} confidence)`;
  const aim =
    state === 'not shown'
      ? ` The target is ${percent(target)}.`
      : state === 'breached'
        ? ' Lower the limit or look at the seat.'
        : '';
  return `${count}${bound}.${aim}`;
}

function plusMinus(relative: number | null): string {
  return relative === null ? '' : ` ± ${percent(relative)}`;
}

function formatEnd(end: number | null): string {
  return end === null ? '…' : formatQuantity(end, { decimals: 2 });
}

/** `0.03`, and `< 0.001` where more digits would mean nothing. */
export function formatP(p: number): string {
  return p < 0.001 ? '< 0.001' : String(Number(p.toPrecision(2)));
}

/** p with its sign, to stand after the letter: `= 0.03`, `< 0.001`. */
export function writtenP(p: number): string {
  const text = formatP(p);
  return text.startsWith('<') ? text : `= ${text}`;
}

function sentence(text: string): string {
  if (text === '') return '';
  const first = text.replace(/^[a-z]/, (letter) => letter.toUpperCase());
  return /[.!?]$/.test(first) ? first : `${first}.`;
}
