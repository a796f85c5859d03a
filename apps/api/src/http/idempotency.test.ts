import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});

afterAll(async () => {
  await shop.close();
});

const leather = (name: string) => ({ name, pricePerFt2: '9.50' });
const add = (key: string, body: object) =>
  shop.as('owner').post('/api/leathers').set('Idempotency-Key', key).send(body);
const namesOf = async (q: string) => {
  const { body } = await shop.as('owner').get(`/api/leathers?q=${q}`);
  return (body.items as { name: string }[]).map((item) => item.name);
};

describe('[S35][I10] the same key', () => {
  it('has one effect and one reply', async () => {
    const first = await add('key-one', leather('Repeated')).expect(201);
    const second = await add('key-one', leather('Repeated')).expect(201);
    expect(second.body).toEqual(first.body);
    expect(second.headers['idempotent-replayed']).toBe('true');
    expect(await namesOf('Repeated')).toEqual(['Repeated']);
  });

  it('has one effect when both requests come at once', async () => {
    const replies = await Promise.all(
      [1, 2, 3, 4].map(() => add('key-at-once', leather('At once'))),
    );
    expect(replies.map((reply) => reply.status)).toEqual([201, 201, 201, 201]);
    expect(new Set(replies.map((reply) => reply.body.id)).size).toBe(1);
    expect(await namesOf('At once')).toEqual(['At once']);
  });

  it('gives back every character of the reply', async () => {
    const name = `It's "new"\\? 5 % — ☕ :name ? ; \u2028 --`;
    const first = await add('key-odd', leather(name)).expect(201);
    const second = await add('key-odd', leather(name)).expect(201);
    expect(second.body).toEqual(first.body);
    expect(second.body.name).toBe(name);
  });

  it('is refused with other words', async () => {
    await add('key-two', leather('One')).expect(201);
    const { body } = await add('key-two', leather('Another')).expect(422);
    expect(body.detail).toContain('Send a new key');
    expect(await namesOf('Another')).toEqual([]);
  });

  it('may be used again after a refusal, which had no effect', async () => {
    await add('key-three', leather('')).expect(422);
    await add('key-three', leather('Third time')).expect(201);
  });
});
