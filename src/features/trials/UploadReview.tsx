import type { ReactNode } from 'react';
import { Link } from 'react-router';
import type { LogAnswer, LogMappingInput } from '../../../shared/schemas/trialLog.ts';
import { Button } from '../../ui/Button.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { Panel } from '../../ui/Panel.tsx';
import { ColumnControls } from './ColumnControls.tsx';
import { FileButton } from './FileButton.tsx';
import { FileControls } from './FileControls.tsx';
import { NewPositions } from './NewPositions.tsx';
import { RefusedDownload } from './RefusedDownload.tsx';
import { RowProblems } from './RowProblems.tsx';
import { counted, planWords } from './uploadWords.ts';

interface UploadReviewProps {
  fixtureId: number;
  fileName: string;
  answer: LogAnswer;
  given: LogMappingInput;
  change: (next: LogMappingInput) => void;
  /** a change of the controls is being read */
  reading: boolean;
  map: (rows: LogAnswer['preview']) => ReactNode;
  store: () => void;
  storing: boolean;
  refusal: Error | null;
  take: (file: File) => void;
}

/** Left the file as it was understood, right what storing it will do. */
export function UploadReview(props: UploadReviewProps) {
  const { fixtureId, fileName, answer, given, change, reading, map, store, storing, take } = props;
  const { log, problems, oddities } = answer;
  const known = log.duplicateOf !== undefined;
  return (
    <div className="space-y-4">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p className="text-lg" role="status">
          <span className="font-bold break-all">{fileName}</span>:{' '}
          {reading ? 'reading it again…' : planWords(answer)}
        </p>
        <div className="flex flex-wrap gap-2">
          <FileButton take={take}>Another file</FileButton>
          <Button
            look="primary"
            disabled={log.accepted === 0 || reading || known}
            busy={storing}
            onClick={store}
          >
            {storing ? 'Storing…' : `Store ${counted(log.accepted, 'trial')}`}
          </Button>
        </div>
      </div>
      {log.duplicateOf !== undefined && (
        <Notice tone="warning">
          This very file is stored already.{' '}
          <Link to={`/fixtures/${fixtureId}/trials?log=${log.duplicateOf}`}>See its trials</Link>
        </Notice>
      )}
      {props.refusal !== null && <ErrorState error={props.refusal} />}
      <div className="grid grid-cols-1 items-start gap-4 lg:grid-cols-2">
        <Panel title="The file as it was understood">
          <div className="space-y-4">
            {answer.headers.length > 0 && (
              <ColumnControls answer={answer} given={given} change={change} />
            )}
            <FileControls answer={answer} given={given} change={change} />
          </div>
        </Panel>
        <div className="space-y-4">
          {answer.preview.length > 0 && (
            <Panel title="Where the new trials lie">{map(answer.preview)}</Panel>
          )}
          {problems.length > 0 && (
            <Panel
              title={
                problems.some(({ row }) => row === 0)
                  ? 'What must be settled first'
                  : 'Refused rows'
              }
              actions={<RefusedDownload problems={problems} fileName={fileName} />}
            >
              <RowProblems problems={problems} title="Refused rows" />
            </Panel>
          )}
          <NewPositions answer={answer} given={given} change={change} />
          {oddities.length > 0 && (
            <Panel title="Stored, but worth a second look">
              <RowProblems problems={oddities} title="Rows that look odd" />
            </Panel>
          )}
        </div>
      </div>
    </div>
  );
}
