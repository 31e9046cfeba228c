import { useState } from 'react';
import { reasonSchema } from '../../../shared/schemas/common.ts';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { trialWords } from '../../charts/trialWords.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { TextArea } from '../../ui/TextArea.tsx';
import { useChangeTrial } from './trialQueries.ts';

/** Asks why a trial is to be left out, or taken back in; the trial itself is never deleted. */
export function ExcludeDialog({ trial, close }: { trial: Trial; close: () => void }) {
  const [reason, setReason] = useState('');
  const [refusal, setRefusal] = useState<string>();
  const change = useChangeTrial(trial.fixtureId);
  const verb = trial.excluded ? 'Restore' : 'Exclude';
  return (
    <Dialog title={`${verb} this trial?`} description={trialWords(trial)} open onOpenChange={close}>
      <form
        className="space-y-4"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          const parsed = reasonSchema.safeParse(reason);
          setRefusal(parsed.error?.issues[0]?.message);
          if (!parsed.success) return;
          const { id, version, excluded } = trial;
          change.mutate(
            { id, version, excluded: !excluded, reason: parsed.data },
            { onSuccess: close },
          );
        }}
      >
        <p>
          {trial.excluded
            ? 'It will count again in the boundary.'
            : 'It stays in the table and in the picture, marked, but no longer counts in the boundary.'}
        </p>
        <TextArea
          label="Reason"
          hint="Somebody will read it a year from now: what happened, and how you know."
          required
          maxLength={5000}
          value={reason}
          error={refusal}
          onChange={(event) => setReason(event.target.value)}
        />
        {change.isError && <ErrorState error={change.error} />}
        <div className="flex justify-end gap-2">
          <Button onClick={close}>Cancel</Button>
          <Button type="submit" look="primary" busy={change.isPending}>
            {verb} trial
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
