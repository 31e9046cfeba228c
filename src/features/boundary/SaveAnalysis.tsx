import { useState } from 'react';
import type { AnalysisOptions } from '../../../shared/schemas/analysis.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { TextArea } from '../../ui/TextArea.tsx';
import { useSaveAnalysis } from './boundaryQueries.ts';

/** Keeps what is on the screen, with a word on why. */
export function SaveAnalysis({
  fixtureId,
  options,
}: {
  fixtureId: number;
  options: AnalysisOptions;
}) {
  const [open, setOpen] = useState(false);
  const [note, setNote] = useState('');
  const save = useSaveAnalysis(fixtureId);
  const change = (next: boolean) => {
    setOpen(next);
    if (next) {
      setNote('');
      save.reset();
    }
  };
  return (
    <>
      <Button look="primary" onClick={() => change(true)}>
        Save analysis
      </Button>
      <Dialog
        title="Save this analysis"
        description="It is kept as it is, with the trials and settings it rests on, and never changes again."
        open={open}
        onOpenChange={change}
      >
        <form
          className="space-y-4"
          onSubmit={(event) => {
            event.preventDefault();
            const text = note.trim();
            save.mutate(
              { ...options, note: text === '' ? null : text },
              { onSuccess: () => setOpen(false) },
            );
          }}
        >
          <TextArea
            label="Note"
            hint="What it is for, and what you want to remember. May stay empty."
            maxLength={5000}
            value={note}
            onChange={(event) => setNote(event.target.value)}
          />
          {save.isError && <ErrorState error={save.error} />}
          <div className="flex justify-end gap-2">
            <Button onClick={() => setOpen(false)}>Cancel</Button>
            <Button type="submit" look="primary" busy={save.isPending}>
              Save analysis
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
