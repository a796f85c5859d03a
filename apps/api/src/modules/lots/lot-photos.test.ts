import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { photoSentences } from '@hidewright/contract';
import { png } from '../../testing/grey-picture.ts';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { noteFile } from '../files/stored-files.ts';
import { inTransaction, theProgram } from '../../work.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let [lotId, otherId] = [0, 0];

beforeAll(async () => {
  shop = await startTestShop();
  const { leatherId } = await stockUp(shop);
  const lot = { leatherId, form: 'side', measuredAreaMm2: ft2(22) };
  const { body } = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [lot, lot] })
    .expect(201);
  [lotId, otherId] = (body.lots as { id: number }[]).map(({ id }) => id) as [number, number];
});
afterAll(() => shop.close());

const send = (bytes: Buffer, type = 'image/png', lot = lotId) =>
  shop.as('maker').post(`/api/lots/${lot}/photos`).set('Content-Type', type).send(bytes);
const outline = [
  { x: 0, y: 0 },
  { x: 2000, y: 0 },
  { x: 2000, y: 900 },
];
async function draw(change: object) {
  const address = `/api/lots/${lotId}/drawing`;
  const { version } = (await shop.as('maker').get(address).expect(200)).body;
  const drawing = { outline, flaws: [], usablePercent: '85', ...change };
  return shop.as('maker').put(address).set('If-Match', `"${version}"`).send(drawing);
}

describe('a photo under the drawing of a side', () => {
  it('is kept with the drawing, and stays when only the edge is drawn anew', async () => {
    const picture = png(400, 200);
    const { hash } = (await send(picture).expect(200)).body as { hash: string };
    expect((await send(picture).expect(200)).body).toEqual({ hash });
    const photo = { hash, mmPerPixel: 5.25, x: -40.5, y: 12 };
    expect((await draw({ photo })).body).toMatchObject({ photo });
    expect((await draw({})).body).toMatchObject({ photo });
    const read = await shop.as('owner').get(`/api/lots/${lotId}/photos/${hash}`).expect(200);
    expect(read.headers['content-type']).toBe('image/png');
    expect(Buffer.compare(read.body as Buffer, picture)).toBe(0);

    await shop.as('owner').get(`/api/lots/${otherId}/photos/${hash}`).expect(404);
    await shop.as('bookkeeper').get(`/api/lots/${lotId}/photos/${hash}`).expect(403);
    await shop.nobody().get(`/api/lots/${lotId}/photos/${hash}`).expect(401);
    expect((await draw({ photo: null })).body).toMatchObject({ photo: null });
    await shop.as('owner').get(`/api/lots/${lotId}/photos/${hash}`).expect(404);
  });

  const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="400" height="200"/>');
  it.each([
    ['a drawing', svg, photoSentences.type],
    ['nothing but a name', Buffer.from('\x89PNG\r\n\x1a\n', 'latin1'), photoSentences.type],
    ['one that was cut off', png(400, 200).subarray(0, 60), photoSentences.type],
    ['one too small to see', png(40, 200), photoSentences.pixels],
    ['one too large to show', png(400, 20_000), photoSentences.pixels],
  ])('is refused as %s, with what to do', async (_what, bytes, sentence) => {
    const { body } = await send(bytes).expect(422);
    expect(body.errors).toEqual([{ field: 'photo', message: sentence }]);
  });

  it('is refused by its type and by its weight before it is read', async () => {
    expect((await send(svg, 'image/svg+xml').expect(415)).body.detail).toBe(photoSentences.type);
    const heavy = Buffer.concat([png(400, 200), Buffer.alloc(15_000_000)]);
    expect((await send(heavy).expect(413)).body.detail).toBe(photoSentences.bytes);
    await shop.as('maker').post(`/api/lots/${lotId}/photos`).expect(415);
    await send(png(400, 200), 'image/png', 987_654).expect(404);
  });

  it('is none that is not kept, nor a paper that is', async () => {
    const hash = await shop.context.files.keep(Buffer.from('%PDF-1.7'));
    await inTransaction(shop.context, theProgram, (work) =>
      noteFile(work, { hash, name: 'Q-0001.pdf', type: 'application/pdf', size: 8 }),
    );
    for (const each of [hash, 'a'.repeat(64)]) {
      const { status, body } = await draw({ photo: { hash: each, mmPerPixel: 1, x: 0, y: 0 } });
      expect([status, body.errors?.[0]?.field]).toEqual([422, 'photo.hash']);
    }
    const wild = await draw({ photo: { hash, mmPerPixel: 0, x: 1e9, y: 0 } });
    expect(wild.status).toBe(422);
  });
});
