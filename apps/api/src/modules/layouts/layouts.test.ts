import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { LayoutAsked, StoredLayoutReply } from '@hidewright/contract';
import { startTestShop } from '../../testing/test-shop.ts';
import { StoredLayout } from './layout.entity.ts';

const round: LayoutAsked = {
  layoutBy: 'outline',
  outline: { shape: 'round', diameterMm: '100' },
  handCount: null,
  container: { form: 'panel', widthMm: '300', heightMm: '200' },
  turns: 'quarter turns',
  spacingMm: '0',
  trimMm: '0',
};

let shop: Awaited<ReturnType<typeof startTestShop>>;
beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const ask = (body: object) => shop.as('owner').post('/api/layouts').send(body);
const faultsOf = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);

describe('a layout', () => {
  it('gives 3 × 2 rounds of 100 mm from exactly 300 × 200 mm, drawn', async () => {
    const { body } = await ask(round).expect(201);
    const stored = body as StoredLayoutReply;
    expect(stored.layout.pieces).toBe(6);
    expect(stored.layout.placements).toHaveLength(6);
    expect(stored.layout.containerAreaMm2).toBe('60000');
    expect(stored.outlinePath).toMatch(/^M /);
  });

  it('is stored once: the same input, written another way, finds the same one', async () => {
    const first = (await ask({ ...round, spacingMm: '1.5' }).expect(201)).body as StoredLayoutReply;
    const again = (await ask({ ...round, spacingMm: '1.50' }).expect(201))
      .body as StoredLayoutReply;
    expect(again).toEqual(first);
    const other = (await ask({ ...round, spacingMm: '1.6' }).expect(201)).body as StoredLayoutReply;
    expect(other.id).not.toBe(first.id);
    const rows = await shop.context.orm.em
      .fork()
      .find(StoredLayout, { id: { $in: [first.id, other.id] } });
    expect(rows).toHaveLength(2);
    expect((await shop.as('maker').get(`/api/layouts/${first.id}`).expect(200)).body).toEqual(
      first,
    );
  });

  it('by hand count takes what was counted, without a drawing', async () => {
    const handCount = { pieces: 21, widthMm: '279.4', heightMm: '330.2' };
    const { body } = await ask({
      ...round,
      layoutBy: 'hand count',
      outline: null,
      container: null,
      handCount,
    }).expect(201);
    const { layout, outlinePath } = body as StoredLayoutReply;
    expect(layout).toMatchObject({ by: 'hand count', pieces: 21, placements: [] });
    expect(outlinePath).toBeNull();
    // 279.4 × 330.2 ÷ 21
    expect(layout.areaPerPieceMm2).toBe('4393.232');
  });

  it('with both drawn and counted, follows what was chosen', async () => {
    const handCount = { pieces: 5, widthMm: '300', heightMm: '200' };
    const counted = await ask({ ...round, handCount, layoutBy: 'hand count' }).expect(201);
    const drawn = await ask({ ...round, handCount }).expect(201);
    expect([counted.body.layout.pieces, drawn.body.layout.pieces]).toEqual([5, 6]);
  });

  it('says honestly that an outline larger than the panel gives nothing', async () => {
    const { body } = await ask({ ...round, outline: { shape: 'round', diameterMm: '250' } }).expect(
      201,
    );
    expect((body as StoredLayoutReply).layout).toMatchObject({
      pieces: 0,
      placements: [],
      areaPerPieceMm2: null,
    });
  });
});

describe('a layout is refused, with a sentence at the field,', () => {
  it.each([
    ['negative spacing', { spacingMm: '-1' }, 'spacingMm'],
    ['spacing that is no number', { spacingMm: 'NaN' }, 'spacingMm'],
    ['spacing as a JSON number', { spacingMm: 2 }, 'spacingMm'],
    ['spacing with too many decimals', { spacingMm: '0.1234567' }, 'spacingMm'],
    ['spacing beyond 100 mm', { spacingMm: '100.1' }, 'spacingMm'],
    ['negative trim', { trimMm: '-0.5' }, 'trimMm'],
    ['an exponent', { trimMm: '1e1' }, 'trimMm'],
    [
      'a diameter of nothing',
      { outline: { shape: 'round', diameterMm: '0' } },
      'outline.diameterMm',
    ],
    [
      'an infinite diameter',
      { outline: { shape: 'round', diameterMm: 'Infinity' } },
      'outline.diameterMm',
    ],
    [
      'a diameter beyond 5 m',
      { outline: { shape: 'round', diameterMm: '5001' } },
      'outline.diameterMm',
    ],
    ['no shape', { outline: { shape: 'star', diameterMm: '95' } }, 'outline.shape'],
    [
      'a measure of another shape',
      { outline: { shape: 'round', diameterMm: '95', widthMm: '9' } },
      'outline.widthMm',
    ],
    [
      'corners rounder than the piece',
      { outline: { shape: 'rectangle', widthMm: '60', heightMm: '40', cornerRadiusMm: '20.1' } },
      'outline.cornerRadiusMm',
    ],
    [
      'a neck wider than its tag',
      {
        outline: {
          shape: 'tag',
          lengthMm: '110',
          widthMm: '50',
          neckLengthMm: '30',
          neckWidthMm: '50',
          cornerRadiusMm: '5',
        },
      },
      'outline.neckWidthMm',
    ],
    [
      'a neck longer than its tag',
      {
        outline: {
          shape: 'tag',
          lengthMm: '110',
          widthMm: '50',
          neckLengthMm: '110',
          neckWidthMm: '20',
          cornerRadiusMm: '0',
        },
      },
      'outline.neckLengthMm',
    ],
    [
      'a flat panel',
      { container: { form: 'panel', widthMm: '300', heightMm: '0' } },
      'container.heightMm',
    ],
    [
      'a strip without a length',
      { container: { form: 'strip', widthMm: '100' } },
      'container.lengthMm',
    ],
    ['no panel', { container: null }, 'container'],
    ['no outline', { outline: null }, 'outline'],
    ['no hand count where it drives', { layoutBy: 'hand count' }, 'handCount'],
    [
      'a hand count of nothing',
      { handCount: { pieces: 0, widthMm: '300', heightMm: '200' } },
      'handCount.pieces',
    ],
    [
      'half a piece',
      { handCount: { pieces: 1.5, widthMm: '300', heightMm: '200' } },
      'handCount.pieces',
    ],
    ['an unknown field', { kerf: '1' }, 'kerf'],
  ])('for %s', async (_what, change, field) => {
    const before = await shop.context.orm.em.fork().count(StoredLayout);
    const { body } = await ask({ ...round, ...change }).expect(422);
    expect(faultsOf(body)).toEqual([field]);
    expect(body.errors[0].message).toMatch(/^[A-Za-z].{8,}\.$/);
    expect(await shop.context.orm.em.fork().count(StoredLayout)).toBe(before);
  });

  it('for more pieces than a picture can hold, said by the worker', async () => {
    const tiny = {
      outline: { shape: 'round', diameterMm: '1' },
      container: { form: 'panel', widthMm: '5000', heightMm: '5000' },
    };
    const { body } = await ask({ ...round, ...tiny }).expect(422);
    expect(body.detail).toContain('More than 20000 pieces');
  });

  it('to whom it is not open', async () => {
    await shop.as('maker').post('/api/layouts').send(round).expect(403);
    await shop.as('bookkeeper').get('/api/layouts/1').expect(403);
    await shop.nobody().get('/api/layouts/1').expect(401);
    await shop.as('owner').get('/api/layouts/999999').expect(404);
  });
});
