import {
  type AnalysisOptions,
  type ConfigurationResult,
} from '../../../shared/schemas/analysis.ts';
import { checkWords, type CheckWords } from './checkWords.ts';

const tones: Record<CheckWords['tone'], { mark: string; className: string }> = {
  good: { mark: '✓', className: 'text-accent' },
  doubt: { mark: '?', className: 'text-ink' },
  bad: { mark: '✕', className: 'text-lost' },
  quiet: { mark: '–', className: 'text-muted' },
};

/** Why the chosen configuration has its verdict: its sentence, then the three checks. */
export function WhyPanel({
  configuration,
  options,
  told,
}: {
  configuration: ConfigurationResult;
  options: AnalysisOptions;
  /** the page's first line says the sentence already */
  told: boolean;
}) {
  return (
    <div className="p-3">
      {!told && <p className="mb-3 max-w-prose">{configuration.sentence}</p>}
      <dl className="space-y-3">
        {checkWords(configuration, options).map(({ name, question, state, tone, words }) => (
          <div key={name}>
            <dt className="flex flex-wrap items-baseline gap-x-2">
              <span className={`font-bold ${tones[tone].className}`}>
                <span aria-hidden="true">{tones[tone].mark} </span>
                {name}: {state}
              </span>
              <span className="text-sm text-muted">{question}</span>
            </dt>
            <dd className="m-0 text-sm">{words}</dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
