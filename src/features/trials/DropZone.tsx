import { type DragEvent, useId, useState } from 'react';
import { FileButton } from './FileButton.tsx';
import { refusalOfFile } from './refusalOfFile.ts';

/** Takes one file, dropped or chosen. */
export function DropZone({ take }: { take: (file: File) => void }) {
  const [over, setOver] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const hint = useId();

  const drop = (files: FileList) => {
    const [file, ...others] = files;
    if (file === undefined) return;
    const reason =
      others.length > 0
        ? 'Drop one log at a time, so that each can be checked.'
        : refusalOfFile(file);
    setRefusal(reason);
    if (reason === null) take(file);
  };
  const dragged = (event: DragEvent, inside: boolean) => {
    event.preventDefault();
    setOver(inside);
  };

  return (
    <div
      onDragOver={(event) => dragged(event, true)}
      onDragLeave={(event) => dragged(event, false)}
      onDrop={(event) => {
        dragged(event, false);
        drop(event.dataTransfer.files);
      }}
      className={`rounded-lg border-2 border-dashed px-6 py-12 text-center ${over ? 'border-accent bg-chosen' : 'border-control'}`}
    >
      <p className="text-lg font-bold">Drop a trial log here</p>
      <p className="mx-auto mt-1 mb-4 max-w-prose text-muted" id={hint}>
        A CSV or text file with one trial a row, at most 16 MiB. Nothing is stored before you have
        seen how it was understood.
      </p>
      <FileButton take={take} describedBy={hint}>
        Choose a file
      </FileButton>
      {refusal !== null && (
        <p role="alert" className="mt-3 text-lost">
          {refusal}
        </p>
      )}
    </div>
  );
}
