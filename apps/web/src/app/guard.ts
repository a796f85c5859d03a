import type { Endpoint } from '@hidewright/contract';
import type { MiddlewareFunction } from 'react-router-dom';
import { redirect } from 'react-router-dom';
import { sessionQuery } from '../features/session/session.queries.ts';
import { queryClient } from '../lib/query-client.ts';
import { roomAt } from './rooms.ts';

/** Before anything is read: is somebody signed in? */
export const guardSession: MiddlewareFunction = async ({ request }) => {
  const session = await queryClient.ensureQueryData(sessionQuery());
  if (session.firstRun) throw redirect('/open-shop');
  if (session.person) return;
  const { pathname, search } = new URL(request.url);
  const wanted = pathname === '/' ? '' : `?to=${encodeURIComponent(pathname + search)}`;
  throw redirect(`/sign-in${wanted}`);
};

/** Does this room open for them? The API asks the same again. */
export const guardRoom: MiddlewareFunction = async ({ request }) => {
  const { person } = await queryClient.ensureQueryData(sessionQuery());
  const room = roomAt(new URL(request.url).pathname);
  if (!person || !room || room.roles.includes(person.role)) return;
  throw redirect(`/closed${room.path}`);
};

/**
 * A page opens only to those who may ask what it shows, a form only to those who may save it: whoever else comes by its
 * address is told so.
 */
export const opensFor =
  ({ access, method }: Endpoint): MiddlewareFunction =>
  async () => {
    const { person } = await queryClient.ensureQueryData(sessionQuery());
    if (typeof access === 'string' || (person && access.includes(person.role))) return;
    const who = `Only the ${access.join(' or the ')} can`;
    const sentence =
      method === 'GET' ? `${who} see this.` : `${who} write this. You can read what is there.`;
    throw new Response(sentence, { status: 403 });
  };

/** Where to go after signing in: only ever a place within this program. */
export function placeAfterSignIn(search: URLSearchParams): string {
  const wanted = search.get('to') ?? '';
  return /^\/(?![/\\])/.test(wanted) ? wanted : '/today';
}
