import { useCallback } from 'react';
import { useNavigate } from 'react-router';
import type { ParityPoint } from '../../../shared/schemas/overview.ts';
import { type Verdict, verdicts } from '../../../shared/schemas/verdict.ts';
import type { ChartTheme } from '../../charts/chartTheme.ts';
import { drawParity } from '../../charts/drawParity.ts';
import { Plot } from '../../charts/Plot.tsx';
import { VerdictWord } from '../../charts/VerdictWord.tsx';
import { parityAlternative } from './parityAlternative.ts';
import { ParityTable } from './ParityTable.tsx';

/** Theory against trials, one mark a configuration; a mark leads to its fixture. */
export function ParityPicture({ points }: { points: readonly ParityPoint[] }) {
  const navigate = useNavigate();
  const draw = useCallback((theme: ChartTheme) => drawParity(points, theme), [points]);
  const present = verdicts.filter((verdict) => points.some((point) => point.verdict === verdict));
  return (
    <Plot
      draw={draw}
      alternative={parityAlternative(points)}
      height="h-[24rem]"
      chartKey={<ParityKey verdicts={present} />}
      tableTitle="The picture as a table"
      table={<ParityTable points={points} />}
      onChoose={(fixtureId) => void navigate(`/fixtures/${fixtureId}/boundary`)}
    />
  );
}

function ParityKey({ verdicts: present }: { verdicts: readonly Verdict[] }) {
  return (
    <>
      <ul aria-label="Key to the picture" className="mt-1 flex flex-wrap gap-x-4 gap-y-1 text-sm">
        {present.map((verdict) => (
          <li key={verdict}>
            <VerdictWord verdict={verdict} />
          </li>
        ))}
      </ul>
      <p className="mt-1 text-sm text-muted">
        On the dashed line theory and trials agree; below it parts slip earlier than theory says.
      </p>
    </>
  );
}
