import { type AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { writtenP } from './checkWords.ts';

type Comparison = AnalysisResult['comparisons'][number];

/** What each model says about the fixture. */
export const modelTitles: Record<string, string> = {
  scaled: 'One torque for all configurations',
  power: 'Torque changes with inertia by a power',
  offsets: 'Every configuration its own level, one steepness',
  separate: 'Every configuration by itself',
};

/** Whether the fuller model earns its extra freedom, in one sentence. */
export function comparisonWords({ simpler, fuller, p }: Comparison, confidence: number): string {
  const title = (name: string) => `“${(modelTitles[name] ?? name).toLowerCase()}”`;
  if (p === null)
    return `${title(simpler)} and ${title(fuller)} could not be compared.`.replace(/^“./, upper);
  return p < 1 - confidence
    ? `The trials speak against ${title(simpler)} (p ${writtenP(p)}); ${title(fuller)} describes them better.`
    : `Nothing speaks against ${title(simpler)} here (p ${writtenP(p)}).`;
}

const upper = (text: string) => text.toUpperCase();
