import { useQuery } from '@tanstack/react-query';
import { LogList } from '../features/trials/LogList.tsx';
import { RunOrder } from '../features/trials/RunOrder.tsx';
import { TrialBrowser } from '../features/trials/TrialBrowser.tsx';
import { logsQuery } from '../features/trials/trialQueries.ts';
import { counted } from '../features/trials/uploadWords.ts';
import { useMay } from '../lib/session.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ButtonLink } from '../ui/ButtonLink.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';
import { Panel } from '../ui/Panel.tsx';

/** Where the trials came from, and every one of them. */
export function TrialsPage() {
  const id = useFixtureId();
  useTitle('Trials');
  const mayUpload = useMay('uploadLogs');
  const logs = useQuery(logsQuery(id)).data?.items ?? [];
  const stored = logs.reduce((sum, { accepted }) => sum + accepted, 0);
  return (
    <>
      <PageHeader
        title="Trials"
        actions={
          mayUpload ? (
            <ButtonLink look="primary" to={`/fixtures/${id}/trials/upload`}>
              Upload a trial log
            </ButtonLink>
          ) : undefined
        }
      >
        {logs.length > 0 && (
          <p>
            {counted(stored, 'trial')} from {counted(logs.length, 'log')}.
          </p>
        )}
      </PageHeader>
      <div className="space-y-4">
        <Panel title="Logs">
          <LogList fixtureId={id} />
        </Panel>
        {stored > 0 && (
          <>
            <Panel title="All trials">
              <TrialBrowser fixtureId={id} />
            </Panel>
            <Panel title="In the order they were run">
              <RunOrder fixtureId={id} />
            </Panel>
          </>
        )}
      </div>
    </>
  );
}
