import { useState } from 'react';
import type { AnalysisResult, Boundary } from '../../../shared/schemas/analysis.ts';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { VerdictWord } from '../../charts/VerdictWord.tsx';
import { useMay } from '../../lib/session.ts';
import { PageHeader } from '../../ui/PageHeader.tsx';
import { BoundaryBelow } from './BoundaryBelow.tsx';
import { BoundaryMap } from './BoundaryMap.tsx';
import { BoundaryNotices } from './BoundaryNotices.tsx';
import { ColumnTrials } from './ColumnTrials.tsx';
import { trialMark } from './mapSceneOf.ts';
import { Notes } from './Notes.tsx';
import { PositionList } from './PositionList.tsx';
import { SaveAnalysis } from './SaveAnalysis.tsx';
import { useMapView } from './useMapView.ts';
import { WhyPanel } from './WhyPanel.tsx';
import { worstConfiguration } from './worstConfiguration.ts';

interface BoundaryScreenProps {
  boundary: Boundary;
  result: AnalysisResult;
  trials: readonly Trial[];
  driveLimit: number | null;
}

/** Verdict first, the picture and the checks second, numbers and method below. */
export function BoundaryScreen({ boundary, result, trials, driveLimit }: BoundaryScreenProps) {
  const state = useMapView();
  const maySave = useMay('saveAnalyses');
  const [marked, setMarked] = useState<string | null>(null);
  const { fixtureId } = boundary;
  const chosen =
    result.configurations.find(({ label }) => label === state.position) ??
    worstConfiguration(result.configurations);

  const choose = (mark: string) => {
    const trial = trials.find(({ id }) => trialMark(id) === mark);
    setMarked(trial === undefined ? null : String(trial.id));
    state.change({ position: trial?.configuration ?? mark });
  };

  return (
    <>
      <PageHeader
        title="Boundary"
        actions={
          maySave ? <SaveAnalysis fixtureId={fixtureId} options={boundary.options} /> : undefined
        }
      >
        <p>{result.sentence}</p>
      </PageHeader>
      <BoundaryNotices boundary={boundary} result={result} />
      <div className="mb-4 grid grid-cols-1 items-start gap-4 lg:grid-cols-[minmax(0,1fr)_24rem] lg:grid-rows-[auto_1fr]">
        <BoundaryMap
          boundary={boundary}
          trials={trials}
          driveLimit={driveLimit}
          chosen={chosen?.label ?? null}
          state={state}
          onChoose={choose}
        />
        <div className="space-y-4 lg:row-span-2">
          <section aria-labelledby="positions" className="rounded-lg border border-line bg-raised">
            <h2 id="positions" className="border-b border-line px-3 py-2.5">
              Positions <span className="text-sm font-normal text-muted">rad/s²</span>
            </h2>
            <PositionList
              configurations={result.configurations}
              positions={boundary.positions}
              commonTorque50={result.commonTorque50}
              chosen={chosen?.label ?? null}
              linkTo={state.linkTo}
            />
          </section>
          {chosen !== null && (
            <section aria-labelledby="why" className="rounded-lg border border-line bg-raised">
              <h2 id="why" className="border-b border-line px-3 py-2.5">
                Why {chosen.label}: <VerdictWord verdict={chosen.verdict} />
              </h2>
              <WhyPanel
                configuration={chosen}
                options={boundary.options}
                told={result.sentence.startsWith(chosen.sentence)}
              />
              <ColumnTrials
                fixtureId={fixtureId}
                label={chosen.label}
                trials={trials}
                marked={marked}
              />
            </section>
          )}
        </div>
        <Notes result={result} />
      </div>
      <BoundaryBelow boundary={boundary} result={result} />
    </>
  );
}
