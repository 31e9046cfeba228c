import type { ReactNode } from 'react';
import { Link } from 'react-router';
import type { Boundary } from '../../../shared/schemas/analysis.ts';
import { useMay } from '../../lib/session.ts';
import { ButtonLink } from '../../ui/ButtonLink.tsx';
import { Notice } from '../../ui/Notice.tsx';

/** The one thing that is missing next, for somebody who may do it. */
export function NextStep({ fixtureId, boundary }: { fixtureId: number; boundary: Boundary }) {
  const mayUpload = useMay('uploadLogs');
  const mayEdit = useMay('editFixtures');
  const at = (place: string) => `/fixtures/${fixtureId}/${place}`;
  const step = stepOf(boundary, at);
  const allowed =
    step.needs === 'editFixtures' ? mayEdit : step.needs === 'uploadLogs' ? mayUpload : true;
  return (
    <Notice>
      <p>{step.text}</p>
      {allowed && <div className="mt-2 flex flex-wrap gap-2">{step.action}</div>}
    </Notice>
  );
}

type Step = { text: ReactNode; needs: 'editFixtures' | 'uploadLogs' | null; action: ReactNode };

function stepOf(boundary: Boundary, at: (place: string) => string): Step {
  if (boundary.polynomial === null || boundary.positions.length === 0) {
    return {
      text: 'Enter the bodies that turn with the part, and the positions of the mass: theory needs the inertia.',
      needs: 'editFixtures',
      action: <ButtonLink to={at('build-up')}>Enter the build-up</ButtonLink>,
    };
  }
  if (boundary.result === null) {
    return {
      text: boundary.reason,
      needs: 'uploadLogs',
      action: (
        <ButtonLink to={at('trials/upload')} look="primary">
          Upload a log
        </ButtonLink>
      ),
    };
  }
  const unchecked = boundary.result.configurations.some(
    ({ level }) => level.state === 'not checked',
  );
  if (unchecked) {
    return {
      text: 'Theory is not checked yet: enter incline readings of the pads.',
      needs: 'editFixtures',
      action: <ButtonLink to={at('grip')}>Enter a friction test</ButtonLink>,
    };
  }
  const { counts } = boundary.result;
  return {
    text: (
      <>
        The verdict rests on {counts.trials} trials: {counts.held} held, {counts.slipped} slipped,{' '}
        {counts.lost} lost{boundary.excluded > 0 && `; ${boundary.excluded} more are excluded`}.{' '}
        <Link to={at('trials')}>See the trials</Link>.
      </>
    ),
    needs: null,
    action: (
      <ButtonLink to={at('boundary')} look="primary">
        Open the boundary
      </ButtonLink>
    ),
  };
}
