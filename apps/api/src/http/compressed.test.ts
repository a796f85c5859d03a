import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});

afterAll(async () => {
  await shop.close();
});

describe('a long reply', () => {
  const ask = () => shop.as('owner').get('/api/openapi.json').set('Accept-Encoding', 'gzip');

  it('goes as it is to whoever asks from this machine', async () => {
    const { headers } = await ask().expect(200);
    expect(headers['content-encoding']).toBeUndefined();
  });

  it.each(['X-Forwarded-For', 'Forwarded', 'Via'])(
    'is compressed behind a proxy that says %s',
    async (name) => {
      const { headers } = await ask().set(name, 'for=192.0.2.7').expect(200);
      expect(headers['content-encoding']).toBe('gzip');
    },
  );
});
