import { QueryClient } from '@tanstack/react-query';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { hardwareListQuery, hardwarePagesQuery } from '../features/hardware/hardware.queries.ts';
import { leathersQuery } from '../features/leathers/leathers.queries.ts';
import {
  hardwareChoicesQuery,
  leatherChoicesQuery,
} from '../features/patterns/patterns.queries.ts';
import {
  awaitedOrdersQuery,
  rackQuery,
} from '../features/purchase-orders/purchase-orders.queries.ts';
import { supplierOffersQuery } from '../lib/supplier-offers.queries.ts';
import { suppliersQuery } from '../features/suppliers/suppliers.queries.ts';

const kept = Array.from({ length: 401 }, (_, at) => ({ id: 401 - at }));
const asked: unknown[] = [];

vi.mock('../lib/api.ts', () => ({
  call: (_endpoint: unknown, { query }: { query: { limit: number; cursor?: string } }) => {
    asked.push(query);
    const from = Number(query.cursor ?? 0);
    const end = from + query.limit;
    const next = end < kept.length ? String(end) : null;
    return Promise.resolve({ items: kept.slice(from, end), next });
  },
}));
beforeEach(() => {
  asked.length = 0;
});

const client = () => new QueryClient();

describe('what is chosen from', () => {
  it.each([
    ['hardware', () => client().fetchQuery(hardwareListQuery())],
    ['hardware of a pattern', () => client().fetchQuery(hardwareChoicesQuery())],
    ['leathers', () => client().fetchQuery(leathersQuery())],
    ['leathers of a pattern', () => client().fetchQuery(leatherChoicesQuery())],
    ['suppliers', () => client().fetchQuery(suppliersQuery())],
    ['what a supplier sells', () => client().fetchQuery(supplierOffersQuery({ supplierId: 7 }))],
    ['awaited orders', () => client().fetchQuery(awaitedOrdersQuery())],
    ['the rack', () => client().fetchQuery(rackQuery())],
  ])('has the oldest of %s too', async (_what, read) => {
    const { items } = await read();
    expect(items.map(({ id }) => id)).toEqual(kept.map(({ id }) => id));
    expect(asked).toHaveLength(3);
  });
});

it('a table reads its first page, and the next when asked', async () => {
  const [queries, pages] = [client(), hardwarePagesQuery()];
  const first = await queries.fetchInfiniteQuery(pages);
  expect(first.pages.map(({ items }) => items.length)).toEqual([200]);
  const all = await queries.fetchInfiniteQuery({ ...pages, pages: 3 });
  expect(all.pages.map(({ items }) => items.length)).toEqual([200, 200, 1]);
  expect(all.pages.at(-1)?.next).toBeNull();
});
