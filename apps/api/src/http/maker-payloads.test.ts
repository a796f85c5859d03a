import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { endpoints, type Endpoint } from '@hidewright/contract';
import { createApp } from '../app.ts';
import { closeContext, createContext, type Context } from '../context.ts';
import { customers } from '../seeders/demo/scenario/customers.ts';
import { demoPassword } from '../seeders/demo/scenario/people.ts';
import { demoFolder } from '../testing/demo-folder.ts';

let context: Context;
let maker: ReturnType<typeof supertest.agent>;

beforeAll(async () => {
  context = await createContext(await demoFolder());
  maker = supertest.agent(await createApp(context));
  await maker
    .post('/api/session')
    .send({ email: 'maker@example.com', password: demoPassword })
    .expect(200);
}, 300_000);

afterAll(async () => {
  await closeContext(context);
});

const reads = endpoints.filter(
  (endpoint) =>
    endpoint.method === 'GET' && endpoint.access !== 'link' && endpoint.access.includes('maker'),
);
/** Replies that can be read; files are looked at by their own tests. */
const asIs = ({ query, file }: Endpoint) =>
  file === undefined && (query === undefined || query.safeParse({}).success);
const lists = reads.filter((endpoint) => !endpoint.path.includes('{') && asIs(endpoint));
const ones = reads.filter((endpoint) => endpoint.path.includes('{id}') && asIs(endpoint));

/** Names of fields that tell a price, a cost or a margin. */
const telling = /price|cost|margin|wage|total|charge|amount|target|earn|^left|^owed|paid|iban/i;

/** What is left of stock on a coming day, in pieces or mm²: no money. */
const ofStock = '.days.left';

function tellingFields(value: unknown, at = ''): string[] {
  if (Array.isArray(value)) return value.flatMap((item) => tellingFields(item, at));
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([name, inner]) => {
    const field = `${at}.${name}`;
    const tells = telling.test(name) && inner !== null && !field.endsWith(ofStock);
    const here = tells ? [field] : [];
    return [...here, ...tellingFields(inner, `${at}.${name}`)];
  });
}

function expectNothingTold(path: string, body: unknown): void {
  expect(tellingFields(body).map((field) => `${path}${field}`)).toEqual([]);
  const text = JSON.stringify(body);
  for (const { email, phone, address } of customers) {
    for (const secret of [email, phone, address.split('\n')[0] ?? email])
      expect(text, path).not.toContain(secret);
  }
}

describe('[S15] the maker', () => {
  it.each(lists.map(({ path }) => path))(
    'is told no price and no customer’s address by %s',
    async (path) => {
      const { body } = await maker.get(`/api${path}`).expect(200);
      expectNothingTold(path, body);
    },
  );

  it.each(ones.map(({ path }) => path))('is told none by %s either', async (path) => {
    const list = path.split('/{id}')[0] ?? path;
    const { body: page } = await maker.get(`/api${list}`);
    const items = (page.items ?? []) as { id: number }[];
    for (const { id } of items.slice(0, 12)) {
      const { body, status } = await maker.get(`/api${path.replace('{id}', String(id))}`);
      expect(status, `${path} of ${id}`).toBeLessThan(500);
      expectNothingTold(path, body);
    }
  });

  it('finds no customer and no invoice by searching', async () => {
    const { body } = await maker.get('/api/search?q=Copper').expect(200);
    expect((body.items as { kind: string }[]).map((item) => item.kind)).not.toContain('customer');
  });
});
