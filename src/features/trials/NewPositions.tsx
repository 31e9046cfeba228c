import type { LogAnswer, LogMappingInput } from '../../../shared/schemas/trialLog.ts';
import { Panel } from '../../ui/Panel.tsx';

interface NewPositionsProps {
  answer: LogAnswer;
  given: LogMappingInput;
  change: (next: LogMappingInput) => void;
}

/** Offers a configuration for each position of the log that has none; shown only when it matters. */
export function NewPositions({ answer, given, change }: NewPositionsProps) {
  const { newConfigurations, mapping, problems } = answer;
  const positionColumn = mapping.columns.position;
  const refused = problems.some(
    ({ column, row }) => row > 0 && positionColumn !== undefined && column === positionColumn,
  );
  if (!refused && !mapping.addConfigurations) return null;
  return (
    <Panel title="New positions">
      <label className="flex items-start gap-2">
        <input
          type="checkbox"
          className="mt-1 size-4"
          checked={mapping.addConfigurations}
          onChange={(event) => change({ ...given, addConfigurations: event.target.checked })}
        />
        <span>Add a configuration for every position on the slide that has none yet</span>
      </label>
      {newConfigurations.length > 0 && (
        <p className="mt-2 text-sm">
          Will be added: {newConfigurations.map(({ label }) => label).join(', ')}.
        </p>
      )}
    </Panel>
  );
}
