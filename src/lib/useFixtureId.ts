import { useParams } from 'react-router';

/** The fixture of the address; 0, which no fixture has, when it is not a whole number. */
export function useFixtureId(): number {
  const { id = '' } = useParams();
  return /^[1-9][0-9]{0,9}$/.test(id) ? Number(id) : 0;
}
