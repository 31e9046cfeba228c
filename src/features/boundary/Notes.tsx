import type { AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { Panel } from '../../ui/Panel.tsx';
import { groupNotes } from './groupNotes.ts';

/** What to bear in mind when using these numbers. */
export function Notes({ result }: { result: AnalysisResult }) {
  const labels = result.configurations.map(({ label }) => label);
  return (
    <Panel title="Notes and cautions">
      <ul className="max-w-prose list-disc space-y-1 pl-5">
        {groupNotes(result.notes, labels).map((note) => (
          <li key={note}>{note}</li>
        ))}
        <li>
          A limit holds only for the surfaces, the part and the condition tested. It is engineering
          evidence, not a safety function: guard the swept area and stand clear.
        </li>
      </ul>
    </Panel>
  );
}
