import { judgements, outcomes, type Outcome } from '../../../shared/schemas/trial.ts';
import { type LogAnswer, type LogMappingInput } from '../../../shared/schemas/trialLog.ts';
import { unknownOutcomeWords } from './columnMapping.ts';

interface FileControlsProps {
  answer: LogAnswer;
  given: LogMappingInput;
  change: (next: LogMappingInput) => void;
}

const delimiters = [
  [',', 'comma'],
  [';', 'semicolon'],
  ['\t', 'tab'],
] as const;

/** What the file as a whole means: its words for the outcomes, how they were judged, its signs. */
export function FileControls({ answer, given, change }: FileControlsProps) {
  const { mapping } = answer;
  const unknown = unknownOutcomeWords(mapping, answer.problems);
  const setWord = (word: string, outcome: Outcome) => {
    change({ ...given, outcomes: { ...given.outcomes, [word]: outcome } });
  };
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <fieldset className="m-0 border-0 p-0">
        <legend className="font-bold">Words for the outcome</legend>
        {[...Object.keys(mapping.outcomes), ...unknown].map((word) => (
          <label key={word} className="mt-1 flex items-center gap-2 text-sm">
            <span className="min-w-24 break-all">“{word}”</span>
            <select
              value={Object.hasOwn(mapping.outcomes, word) ? mapping.outcomes[word] : ''}
              onChange={(event) => {
                setWord(word, event.target.value as Outcome);
              }}
              className={selectClass}
            >
              {!Object.hasOwn(mapping.outcomes, word) && <option value="">means …</option>}
              {outcomes.map((outcome) => (
                <option key={outcome}>{outcome}</option>
              ))}
            </select>
          </label>
        ))}
        {Object.keys(mapping.outcomes).length + unknown.length === 0 && (
          <p className="text-sm text-muted">Choose the outcome column first.</p>
        )}
      </fieldset>
      <div className="space-y-2">
        <label className="block text-sm">
          <span className="block font-bold">How were the outcomes judged?</span>
          <select
            value={mapping.judgedBy ?? ''}
            onChange={(event) => {
              const judgedBy = judgements.find((one) => one === event.target.value) ?? null;
              change({ ...given, judgedBy });
            }}
            className={selectClass}
          >
            <option value="">not said</option>
            {judgements.map((judgement) => (
              <option key={judgement}>{judgement}</option>
            ))}
          </select>
        </label>
        {mapping.judgedBy !== null && mapping.judgedBy !== 'peak lag' && (
          <p className="text-sm text-muted">
            {mapping.judgedBy === 'end mark'
              ? 'A part that slips mostly coasts back: close to the limit the end mark hides slips that a peak lag would show. The demonstrated limit is lowered for it.'
              : 'Small slips are missed by eye. The demonstrated limit is lowered for it.'}
          </p>
        )}
        <div className="flex flex-wrap gap-4">
          <label className="block text-sm">
            <span className="block font-bold">Columns are parted by</span>
            <select
              value={mapping.delimiter}
              onChange={(event) => {
                const delimiter = delimiters.find(([sign]) => sign === event.target.value)?.[0];
                // other columns come out: what was said about the old ones no longer holds
                change({ ...given, delimiter, columns: undefined });
              }}
              className={selectClass}
            >
              {delimiters.map(([sign, name]) => (
                <option key={name} value={sign}>
                  {name}
                </option>
              ))}
            </select>
          </label>
          <label className="block text-sm">
            <span className="block font-bold">Decimal sign</span>
            <select
              value={mapping.decimal}
              onChange={(event) => {
                change({ ...given, decimal: event.target.value === ',' ? ',' : '.' });
              }}
              className={selectClass}
            >
              <option value=".">point</option>
              <option value=",">comma</option>
            </select>
          </label>
        </div>
      </div>
    </div>
  );
}

const selectClass =
  'min-h-8 rounded border border-control bg-raised px-2 py-1 text-sm font-normal text-ink';
