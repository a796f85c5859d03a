import type { MiddlewareFunction } from 'react-router-dom';
import { redirect } from 'react-router-dom';
import { sessionQuery } from '../features/session/session.queries.ts';
import { queryClient } from '../lib/query-client.ts';
import { roomAt } from './rooms.ts';

/** Before anything of a room is read: is somebody signed in, and does this room open for them? */
export const guardRooms: MiddlewareFunction = async ({ request }) => {
  const session = await queryClient.ensureQueryData(sessionQuery());
  if (session.firstRun) throw redirect('/open-shop');
  const { pathname, search } = new URL(request.url);
  if (!session.person) {
    const wanted = pathname === '/' ? '' : `?to=${encodeURIComponent(pathname + search)}`;
    throw redirect(`/sign-in${wanted}`);
  }
  const room = roomAt(pathname);
  if (room && !room.roles.includes(session.person.role)) {
    throw new Response(`${room.word} is not open to the ${session.person.role}.`, { status: 403 });
  }
};

/** Where to go after signing in: only ever a place within this program. */
export function placeAfterSignIn(search: URLSearchParams): string {
  const wanted = search.get('to') ?? '';
  return /^\/(?![/\\])/.test(wanted) ? wanted : '/today';
}
