import { useEffect, useRef } from 'react';
import { Link } from 'react-router';
import type { LogAnswer } from '../../../shared/schemas/trialLog.ts';
import { Button } from '../../ui/Button.tsx';
import { ButtonLink } from '../../ui/ButtonLink.tsx';
import { counted } from './uploadWords.ts';

interface UploadDoneProps {
  fixtureId: number;
  fileName: string;
  answer: LogAnswer;
  again: () => void;
}

/** What the stored trials changed, and where to look at it. */
export function UploadDone({ fixtureId, fileName, answer, again }: UploadDoneProps) {
  const { log, changes } = answer;
  const heading = useRef<HTMLHeadingElement>(null);
  // the button that led here is gone: the answer takes the focus
  useEffect(() => heading.current?.focus(), []);
  const trials = `/fixtures/${fixtureId}/trials?log=${log.id ?? log.duplicateOf ?? ''}`;
  return (
    <section className="rounded-lg border border-line bg-raised p-6">
      <h2 ref={heading} tabIndex={-1} className="focus:outline-none">
        {log.duplicateOf === undefined
          ? `${counted(log.accepted, 'trial')} stored`
          : 'This very file is stored already'}
      </h2>
      <p className="mt-1 text-muted">
        <span className="break-all">{fileName}</span>
        {log.refused > 0 && (
          <>
            , {counted(log.refused, 'row')} refused (<Link to={trials}>kept with the log</Link>)
          </>
        )}
      </p>
      {changes.length > 0 && (
        <ul className="mt-4 list-disc space-y-1 pl-5 text-lg">
          {changes.map((change) => (
            <li key={change}>{change}</li>
          ))}
        </ul>
      )}
      <p className="mt-5 flex flex-wrap gap-2">
        <ButtonLink look="primary" to={`/fixtures/${fixtureId}/boundary`}>
          See the boundary
        </ButtonLink>
        <ButtonLink to={trials}>See these trials</ButtonLink>
        <Button onClick={again}>Upload another log</Button>
      </p>
    </section>
  );
}
