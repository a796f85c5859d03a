import type { Role } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { sessionQuery } from '../../../features/session/session.queries.ts';

/** What the person who is signed in may do in the stockroom. */
export function useRole(): { role: Role | undefined; isOwner: boolean; handlesStock: boolean } {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const role = session.person?.role;
  return { role, isOwner: role === 'owner', handlesStock: role === 'owner' || role === 'maker' };
}
