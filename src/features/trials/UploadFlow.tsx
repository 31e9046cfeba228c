import { useQuery } from '@tanstack/react-query';
import { type ReactNode, useRef, useState } from 'react';
import type { LogAnswer, LogMappingInput } from '../../../shared/schemas/trialLog.ts';
import { FileRefused } from './FileRefused.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { DropZone } from './DropZone.tsx';
import { dryRunQuery, useStoreLog } from './trialQueries.ts';
import { UploadDone } from './UploadDone.tsx';
import { UploadReview } from './UploadReview.tsx';

interface UploadFlowProps {
  fixtureId: number;
  /** draws the rows over the present boundary */
  map: (rows: LogAnswer['preview']) => ReactNode;
}

/** One file, and which of the files taken so far it is: the same file chosen twice is read twice. */
type Taken = { file: File; turn: number };

/** A log on its way in: drop, see and mend, store, read what changed. */
export function UploadFlow({ fixtureId, map }: UploadFlowProps) {
  const [taken, setTaken] = useState<Taken | null>(null);
  const turns = useRef(0);
  const store = useStoreLog(fixtureId);
  const take = (file: File) => {
    store.reset();
    turns.current += 1;
    setTaken({ file, turn: turns.current });
  };
  if (taken === null) return <DropZone take={take} />;
  if (store.data !== undefined) {
    return (
      <UploadDone
        fixtureId={fixtureId}
        fileName={taken.file.name}
        answer={store.data}
        again={() => {
          store.reset();
          setTaken(null);
        }}
      />
    );
  }
  return (
    <Review
      key={taken.turn}
      fixtureId={fixtureId}
      taken={taken}
      take={take}
      map={map}
      store={(mapping) => store.mutate({ file: taken.file, mapping })}
      storing={store.isPending}
      refusal={store.error}
    />
  );
}

interface ReviewProps extends UploadFlowProps {
  taken: Taken;
  take: (file: File) => void;
  store: (mapping: LogMappingInput) => void;
  storing: boolean;
  refusal: Error | null;
}

function Review({ fixtureId, taken, take, map, store, storing, refusal }: ReviewProps) {
  const [given, setGiven] = useState<LogMappingInput>({});
  const read = useQuery(dryRunQuery(fixtureId, taken.file, taken.turn, given));
  if (read.isError) {
    return (
      <div className="space-y-4">
        <FileRefused
          fileName={taken.file.name}
          error={read.error}
          retry={() => void read.refetch()}
        />
        <DropZone take={take} />
      </div>
    );
  }
  if (read.data === undefined) return <Loading />;
  return (
    <UploadReview
      fixtureId={fixtureId}
      fileName={taken.file.name}
      answer={read.data}
      given={given}
      change={setGiven}
      reading={read.isFetching}
      map={map}
      store={() => store(given)}
      storing={storing}
      refusal={refusal}
      take={take}
    />
  );
}
