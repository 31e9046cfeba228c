import { type Trial } from '../../shared/schemas/trial.ts';
import { formatQuantity } from '../../shared/units/formatQuantity.ts';

type Told = Pick<
  Trial,
  'configuration' | 'acceleration' | 'outcome' | 'row' | 'part' | 'excluded' | 'excludedReason'
>;

/** One trial in one line: the hover text of its mark and the name of its controls. */
export function trialWords(trial: Told): string {
  const part = trial.part === null ? '' : `, part ${trial.part}`;
  const excluded = trial.excluded ? `, excluded: ${trial.excludedReason ?? 'no reason given'}` : '';
  return (
    `${trial.configuration}, ${formatQuantity(trial.acceleration)} rad/s²: ${trial.outcome}` +
    `${part} (row ${trial.row} of its log)${excluded}`
  );
}
