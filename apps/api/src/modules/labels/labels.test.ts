import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { readLabels } from './read-labels.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let lot: { id: number; tag: string };

beforeAll(async () => {
  shop = await startTestShop({ PUBLIC_URL: 'http://shop.example.com' });
  things = await stockUp(shop);
  const side = { leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(24.75) };
  const { body } = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [{ ...side, place: 'rack 2' }] })
    .expect(201);
  lot = body.lots[0];
});
afterAll(() => shop.close());

const print = (query: object) => shop.as('maker').get('/api/labels/file').query(query);

describe('tags', () => {
  it('say what it is, where it lies and when it came, and carry an address', async () => {
    const { hardwareId } = things;
    const labels = await readLabels(shop.context.orm.em.fork(), {
      lots: [lot.id],
      hardware: [hardwareId],
      publicUrl: 'http://shop.example.com',
    });
    const bin = `B-${String(hardwareId).padStart(4, '0')}`;
    expect(labels).toMatchObject([
      {
        tag: lot.tag,
        code: `http://shop.example.com/t/${lot.tag}`,
        lines: ['side, 24.75 ft²', 'rack 2', 'received Tue 1 Dec 2026'],
      },
      {
        tag: bin,
        code: `http://shop.example.com/t/${bin}`,
        lines: ['hardware', 'in packs of 100'],
      },
    ]);
  });

  it('come as a PDF of the size that was asked for', async () => {
    const { body, headers } = await print({
      lots: lot.id,
      page: 'letter',
      rows: 5,
      start: 10,
    }).expect(200);
    expect(headers['content-type']).toContain('application/pdf');
    const text = (body as Buffer).toString('latin1');
    expect(text.startsWith('%PDF')).toBe(true);
    expect(text).toMatch(/MediaBox \[0 0 612 792\]/);
  });

  it('are refused where nothing is chosen, or the sheet cannot be', async () => {
    const faultOf = async (query: object) =>
      (await print(query).expect(422)).body.errors[0].field as string;
    expect(await faultOf({})).toBe('lots');
    expect(await faultOf({ lots: lot.id, columns: 3 })).toBe('columns');
    expect(await faultOf({ lots: lot.id, start: 13 })).toBe('start');
    expect(await faultOf({ lots: lot.id, widthMm: 5 })).toBe('widthMm');
    expect(await faultOf({ lots: 'all' })).toBe('lots');
    await shop.as('bookkeeper').get('/api/labels/file').expect(403);
  });
});
