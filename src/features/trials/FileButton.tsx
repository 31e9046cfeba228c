import { type ReactNode, useRef, useState } from 'react';
import { Button } from '../../ui/Button.tsx';
import { refusalOfFile } from './refusalOfFile.ts';

/** Opens the file dialog; what cannot be a log is refused before it is sent. */
export function FileButton({
  take,
  describedBy,
  children,
}: {
  take: (file: File) => void;
  describedBy?: string;
  children: ReactNode;
}) {
  const input = useRef<HTMLInputElement>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  return (
    <>
      <input
        ref={input}
        type="file"
        accept=".csv,.txt,.tsv,text/csv,text/plain,text/tab-separated-values"
        className="hidden"
        aria-label="Trial log"
        onChange={(event) => {
          const [file] = event.target.files ?? [];
          if (file === undefined) return;
          const reason = refusalOfFile(file);
          setRefusal(reason);
          if (reason === null) take(file);
          event.target.value = '';
        }}
      />
      <Button aria-describedby={describedBy} onClick={() => input.current?.click()}>
        {children}
      </Button>
      {refusal !== null && (
        <p role="alert" className="mt-2 text-lost">
          {refusal}
        </p>
      )}
    </>
  );
}
