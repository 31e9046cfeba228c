import { type DragEvent, useId, useRef, useState } from 'react';

const largestBytes = 16 * 1024 * 1024;

/** Takes one file, dropped or chosen; what cannot be a log is refused before it is sent. */
export function DropZone({ take }: { take: (file: File) => void }) {
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const hint = useId();

  const offer = (files: FileList | null) => {
    const [file, ...others] = files ?? [];
    if (file === undefined) return;
    const reason = refusalOf(file, others.length);
    setRefusal(reason);
    if (reason === null) take(file);
  };
  const dragged = (event: DragEvent, inside: boolean) => {
    event.preventDefault();
    setOver(inside);
  };

  return (
    <div
      onDragOver={(event) => {
        dragged(event, true);
      }}
      onDragLeave={(event) => {
        dragged(event, false);
      }}
      onDrop={(event) => {
        dragged(event, false);
        offer(event.dataTransfer.files);
      }}
      className={`rounded-lg border-2 border-dashed px-6 py-10 text-center ${over ? 'border-accent bg-chosen' : 'border-control'}`}
    >
      <p className="text-lg">Drop a trial log here</p>
      <p className="mt-1 text-muted" id={hint}>
        A CSV or text file with one trial a row, at most 16 MiB. Nothing is stored before you have seen
        how it was understood.
      </p>
      <input
        ref={input}
        type="file"
        accept=".csv,.txt,.tsv,text/csv,text/plain,text/tab-separated-values"
        className="sr-only"
        tabIndex={-1}
        aria-label="Trial log"
        onChange={(event) => {
          offer(event.target.files);
          event.target.value = '';
        }}
      />
      <button
        type="button"
        aria-describedby={hint}
        className="mt-4"
        onClick={() => input.current?.click()}
      >
        Choose a file
      </button>
      <p role="alert" className="mt-3 text-lost">
        {refusal}
      </p>
    </div>
  );
}

function refusalOf(file: File, others: number): string | null {
  if (others > 0) return 'Drop one log at a time, so that each can be checked.';
  if (file.size === 0) return `“${file.name}” is empty.`;
  if (file.size > largestBytes) {
    return `“${file.name}” is larger than 16 MiB. Split it, for instance by day.`;
  }
  return null;
}
