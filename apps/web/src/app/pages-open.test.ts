import type { Endpoint, Role, Session } from '@hidewright/contract';
import type { RouteObject } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import { sessionQuery } from '../features/session/session.queries.ts';
import { queryClient } from '../lib/query-client.ts';
import { roomAt } from './rooms.ts';
import { benchRoutes } from './routes/bench.routes.ts';
import { booksRoutes } from './routes/books.routes.ts';
import { counterRoutes } from './routes/counter.routes.ts';
import { officeRoutes } from './routes/office.routes.ts';
import { patternRoomRoutes } from './routes/pattern-room.routes.ts';
import { stockroomRoutes } from './routes/stockroom.routes.ts';
import { todayRoutes } from './routes/today.routes.ts';

const asked: Endpoint[] = [];

vi.mock('../lib/api.ts', () => ({
  call: (endpoint: Endpoint) => {
    asked.push(endpoint);
    return Promise.resolve({ items: [], next: null });
  },
}));

interface Page {
  path: string;
  guards: readonly unknown[];
  lazy: () => Promise<{ loader?: (asked: object) => unknown }>;
}

/** Every page of a room, with what stands before it. */
function pagesOf(route: RouteObject, above: { path: string; guards: readonly unknown[] }): Page[] {
  const path = [above.path, route.path].filter(Boolean).join('/');
  const guards = [...above.guards, ...(route.middleware ?? [])];
  const own =
    typeof route.lazy === 'function' ? [{ path, guards, lazy: route.lazy as Page['lazy'] }] : [];
  return [...own, ...(route.children ?? []).flatMap((child) => pagesOf(child, { path, guards }))];
}

const pages = [
  ...[todayRoutes, counterRoutes, patternRoomRoutes, benchRoutes],
  ...[stockroomRoutes, booksRoutes, officeRoutes],
].flatMap((room) => room.flatMap((route) => pagesOf(route, { path: '', guards: [] })));

/** What a page says to somebody for whom it is closed, before it has asked anything. */
async function closedTo({ guards }: Page, role: Role): Promise<string | undefined> {
  const session = { firstRun: false, person: { role } } as Session;
  queryClient.clear();
  queryClient.setQueryData(sessionQuery().queryKey, session);
  try {
    for (const guard of guards as (() => Promise<unknown>)[]) await guard();
    return undefined;
  } catch (refusal) {
    if (refusal instanceof Response && refusal.status === 403) return refusal.text();
    throw refusal;
  }
}

/** What a page asks although the API refuses it to them. */
async function refused(page: Page, role: Role): Promise<string[]> {
  if ((await closedTo(page, role)) !== undefined) return [];
  asked.length = 0;
  const { loader } = await page.lazy();
  const request = new Request(`http://shop.example.com${page.path}`);
  // Not every page can make something of an empty answer; what it asked is known all the same.
  await Promise.resolve(loader?.({ params: { id: '1' }, request })).catch(() => undefined);
  return asked
    .filter(({ access }) => typeof access !== 'string' && !access.includes(role))
    .map(({ method, path }) => `${role} ${page.path}: ${method} ${path}`);
}

describe('the pages', () => {
  it.each(pages)('ask nothing that the API would refuse at $path', async (page) => {
    const room = roomAt(page.path);
    expect(room).toBeDefined();
    for (const role of room?.roles ?? []) expect(await refused(page, role)).toEqual([]);
  });

  it.each<[string, Role, string | undefined]>([
    ['/stockroom/to-order', 'bookkeeper', 'Only the owner or the maker can see this.'],
    ['/stockroom/to-order', 'maker', undefined],
    ['/counter/customers/:id', 'maker', 'Only the owner or the bookkeeper can see this.'],
    ['/bench/week-mix', 'maker', 'Only the owner can see this.'],
    [
      '/stockroom/receive',
      'bookkeeper',
      'Only the owner or the maker can write this. You can read what is there.',
    ],
  ])('say at %s to the %s: %s', async (path, role, said) => {
    const page = pages.find((each) => each.path === path);
    expect(page && (await closedTo(page, role))).toBe(said);
  });
});
