import type { AnalysisResult, Boundary } from '../../../shared/schemas/analysis.ts';
import { Disclosure } from '../../ui/Disclosure.tsx';
import { Panel } from '../../ui/Panel.tsx';
import { FrictionLine } from './FrictionLine.tsx';
import { HowComputed } from './HowComputed.tsx';
import { ModelComparison } from './ModelComparison.tsx';
import { NumbersTable } from './NumbersTable.tsx';
import { SavedAnalyses } from './SavedAnalyses.tsx';
import { trustWords } from './trustWords.ts';

/** The numbers, what speaks for and against them, and how they came about. */
export function BoundaryBelow({
  boundary,
  result,
}: {
  boundary: Boundary;
  result: AnalysisResult;
}) {
  const { options, digest, fixtureId } = boundary;
  return (
    <div className="space-y-4">
      <Panel title="Numbers">
        <FrictionLine fixtureId={fixtureId} result={result} />
        <div
          className="mt-4 overflow-x-auto print:overflow-visible"
          tabIndex={0}
          role="region"
          aria-label="Numbers of each configuration"
        >
          <NumbersTable configurations={result.configurations} target={options.target} />
        </div>
      </Panel>
      <Disclosure title="How the models compare">
        <ModelComparison result={result} confidence={options.confidence} />
      </Disclosure>
      <Disclosure title="Can the fit be trusted">
        <ul className="max-w-prose list-disc space-y-1 pl-5">
          {trustWords(result, options.confidence).map((words) => (
            <li key={words}>{words}</li>
          ))}
        </ul>
      </Disclosure>
      <Disclosure title="How this is computed">
        <HowComputed result={result} options={options} digest={digest} />
      </Disclosure>
      <Panel title="Saved analyses">
        <SavedAnalyses fixtureId={fixtureId} />
      </Panel>
    </div>
  );
}
