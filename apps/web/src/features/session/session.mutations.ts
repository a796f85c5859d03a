import { openShop, signIn, signOut, type Session } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { dropAllDrafts } from '../../lib/draft.ts';
import { sessionKey } from '../../lib/query-client.ts';
import { useSend } from '../../lib/use-send.ts';

/** Whoever signs in or out: nothing that the last person read may stay on the screen. */
function useTakeOver() {
  const client = useQueryClient();
  return (session: Session) => {
    dropAllDrafts();
    client.removeQueries({ predicate: (query) => query.queryKey[0] !== 'session' });
    client.setQueryData(sessionKey, session);
  };
}

export function useSignIn() {
  return useSend(signIn, { onSent: useTakeOver(), invalidates: [] });
}

export function useSignOut() {
  return useSend(signOut, { onSent: useTakeOver(), invalidates: [] });
}

export function useOpenShop() {
  return useSend(openShop, { onSent: useTakeOver(), invalidates: [] });
}
