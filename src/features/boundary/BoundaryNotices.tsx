import { Link } from 'react-router';
import type { AnalysisResult, Boundary } from '../../../shared/schemas/analysis.ts';
import { Notice } from '../../ui/Notice.tsx';

/** What to know before reading on: what does not count, what is missing, what has grown old. */
export function BoundaryNotices({
  boundary: { fixtureId, excluded, lastSaved, digest },
  result,
}: {
  boundary: Boundary;
  result: AnalysisResult;
}) {
  const theory = result.configurations.some(
    (one) => one.theory.holding !== null || one.theory.lettingGo !== null,
  );
  const older = lastSaved !== null && lastSaved.digest !== digest;
  if (excluded === 0 && theory && !older) return null;
  return (
    <div className="mb-4 space-y-2">
      {!theory && (
        <Notice tone="warning">
          Theory draws no curve and no limit here: it needs friction tests of this seat.{' '}
          <Link to={`/fixtures/${fixtureId}/grip`}>Enter friction tests</Link>
        </Notice>
      )}
      {excluded > 0 && (
        <Notice>
          {excluded === 1
            ? 'One trial is excluded by hand and does not count here.'
            : `${excluded} trials are excluded by hand and do not count here.`}{' '}
          <Link to={`/fixtures/${fixtureId}/trials?excluded=true`}>See which, and why</Link>
        </Notice>
      )}
      {older && <Notice tone="warning">The last saved analysis is older than the data.</Notice>}
    </div>
  );
}
