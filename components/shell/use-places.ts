import { whoOf } from '../account/session';
import { useSession } from '../account/session-queries';
import { placesOf } from './places';

/** The places of whoever is here. */
export function usePlaces() {
  const { data: session } = useSession();
  return placesOf(whoOf(session)?.role);
}
