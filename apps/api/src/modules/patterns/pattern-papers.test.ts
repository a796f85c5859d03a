import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Pattern, PatternDefinition } from '@hidewright/contract';
import { readDrawing } from '@hidewright/domain';
import { drawnLines, pageCount } from '../../testing/drawn-lines.ts';
import { coaster } from '../../testing/example-pattern.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let leatherId: number;

beforeAll(async () => {
  shop = await startTestShop();
  const leather = { name: 'Oak tan', pricePerFt2: '9.5' };
  leatherId = (await shop.as('owner').post('/api/leathers').send(leather).expect(201)).body.id;
});
afterAll(() => shop.close());

const points = [
  { x: 0, y: 0 },
  { x: 90, y: 0 },
  { x: 90.5, y: 30 },
  { x: 45, y: 42.125 },
  { x: 0, y: 30 },
];
const slot = [
  { x: 5, y: 10 },
  { x: 8, y: 10 },
  { x: 8, y: 20 },
  { x: 5, y: 20 },
];
const drawn = { shape: 'polygon' as const, points, punched: [slot] };

const send = (name: string, change: Partial<PatternDefinition>) =>
  shop
    .as('owner')
    .post('/api/patterns')
    .send({ name, definition: coaster(leatherId, change) });

async function added(name: string, change: Partial<PatternDefinition>): Promise<Pattern> {
  return (await send(name, change).expect(201)).body as Pattern;
}

const fetchFile = (id: number, file: string) =>
  shop
    .as('maker')
    .get(`/api/patterns/${id}/${file}`)
    .buffer(true)
    .parse((response, done) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => done(null, Buffer.concat(parts)));
    });

const fileOf = async (id: number, file: string): Promise<Buffer> =>
  (await fetchFile(id, file).expect(200)).body as Buffer;

const mm = (pt: number) => (pt * 25.4) / 72;

/** The lengths in mm of everything that a page draws. */
function lengthsIn(pdf: Buffer): number[] {
  return drawnLines(pdf).map(({ from, to }) => mm(Math.hypot(to[0] - from[0], to[1] - from[1])));
}

describe('a pattern with an outline from a drawing', () => {
  it('is kept point by point, described, drawn and laid out', async () => {
    const pattern = await added('Drawn tag', { outline: drawn });
    expect(pattern.definition.outline).toEqual(drawn);
    expect(pattern.description).toBe('drawn, 90.5 × 42.13 mm, 1 hole punched');
    expect(pattern.outlinePath?.match(/M/g)).toHaveLength(2);
    expect(pattern.layout.pieces).toBeGreaterThan(10);
    const read = await shop.as('maker').get(`/api/patterns/${pattern.id}`).expect(200);
    expect(read.body).toEqual(pattern);
  });

  it('becomes a new version when its drawing changes, and none when it is the same', async () => {
    const pattern = await added('Changing tag', { outline: drawn });
    const change = (outline: PatternDefinition['outline']) =>
      shop
        .as('owner')
        .patch(`/api/patterns/${pattern.id}`)
        .set('If-Match', `"${pattern.version}"`)
        .send({ definition: coaster(leatherId, { outline }) })
        .expect(200);
    expect((await change(drawn)).body.versionNumber).toBe(1);
    expect((await change({ shape: 'polygon', points })).body.versionNumber).toBe(2);
  });

  const many = Array.from({ length: 3001 }, (_, at) => {
    const angle = (2 * Math.PI * at) / 3001;
    return { x: 50 * Math.cos(angle), y: 50 * Math.sin(angle) };
  });
  const bow = [points[0], points[2], points[1], points[4]];
  it.each([
    ['points', 'crosses itself near x', { ...drawn, points: bow, punched: [] }],
    ['points', 'at least three corners', { ...drawn, points: points.slice(0, 2) }],
    ['points', 'at most 3,000 corners', { ...drawn, points: many }],
    [
      'points',
      'almost nothing',
      { shape: 'polygon', points: points.map(({ x }) => ({ x, y: 0 })) },
    ],
    [
      'points.1.x',
      'x and y in mm',
      { ...drawn, points: [{ x: 0, y: 0 }, { x: '9', y: 0 }, points[2]] },
    ],
    [
      'punched',
      'lies outside the outline',
      { ...drawn, punched: [slot.map(({ x, y }) => ({ x: x + 200, y }))] },
    ],
    [
      'punched',
      'crosses the outline',
      { ...drawn, punched: [slot.map(({ x, y }) => ({ x: x - 6, y }))] },
    ],
    ['widthMm', 'widthMm', { ...drawn, widthMm: '90' }],
  ])('is refused at %s: %s', async (field, sentence, outline) => {
    const { body } = await send('Refused', {
      outline: outline as PatternDefinition['outline'],
    }).expect(422);
    expect(body.errors[0].field).toBe(`definition.outline.${field}`);
    expect(JSON.stringify(body.errors[0])).toContain(sentence);
  });

  it('is refused without a hang for 100,000 corners', async () => {
    const huge = {
      shape: 'polygon' as const,
      points: Array.from({ length: 100_000 }, (_, x) => ({ x, y: 0 })),
    };
    expect((await send('Huge', { outline: huge })).status).toBe(413);
  });
});

describe('the template of a pattern', () => {
  it('as a drawing has the outline’s own size in mm', async () => {
    const { id } = await added('Tag & "co"', { outline: drawn });
    const reply = await fetchFile(id, 'template.svg').expect(200);
    expect(reply.headers['content-type']).toContain('image/svg+xml');
    expect(reply.headers['content-disposition']).toContain('attachment');
    const { unit, closed } = readDrawing((reply.body as Buffer).toString('utf8'));
    expect(unit).toBe('mm');
    expect([closed[0]?.width, closed[0]?.height]).toEqual([90.5, 42.125]);
    expect(closed.some(({ width, height }) => width === 3 && height === 10)).toBe(true);
  });

  it('as a PDF has every length true, and a line of 100 mm to check it by', async () => {
    const { id } = await added('Drawn strap', { outline: drawn });
    const pdf = await fileOf(id, 'template.pdf');
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(pageCount(pdf)).toBe(1);
    const lengths = lengthsIn(pdf).map((length) => Math.round(length * 100) / 100);
    // The check line, the outline's straight sides, the slot's.
    for (const length of [100, 90, 30, 10, 3]) expect(lengths).toContain(length);
    expect(lengths).toContain(Math.round(Math.hypot(45.5, 12.125) * 100) / 100);
    expect(await fileOf(id, 'template.pdf')).toEqual(pdf);
  });

  it('of a round is as wide as it is', async () => {
    const { id } = await added('Round 95', {});
    const lines = drawnLines(await fileOf(id, 'template.pdf'));
    const ends = lines.flatMap(({ from, to }) => [from, to]);
    const apart = ends.flatMap(([x, y]) =>
      ends.filter((other) => Math.abs(other[1] - y) < 0.001).map((other) => mm(other[0] - x)),
    );
    expect(apart.some((across) => Math.abs(across - 95) < 0.001)).toBe(true);
  });

  it('goes over several sheets that overlap where one is too small, each with its line', async () => {
    const outline = {
      shape: 'rectangle' as const,
      widthMm: '400',
      heightMm: '300',
      cornerRadiusMm: '0',
    };
    const { id } = await added('Desk pad', {
      outline,
      container: { form: 'panel', widthMm: '1000', heightMm: '800' },
    });
    const pdf = await fileOf(id, 'template.pdf');
    expect(pageCount(pdf)).toBeGreaterThan(1);
    const lengths = lengthsIn(pdf).map((length) => Math.round(length * 100) / 100);
    expect(lengths.filter((length) => length === 100)).toHaveLength(pageCount(pdf));
    expect(lengths).toContain(400);
  });

  it('keeps the margin that is asked for, where it makes sense', async () => {
    const { id } = await added('Margin', { outline: drawn });
    const svg = (await fileOf(id, 'template.svg?safeMarginMm=5')).toString('utf8');
    expect(svg).toContain('keep artwork 5 mm from the cut');
    for (const margin of ['0', '-3', 'NaN', '101', 'wide']) {
      await fetchFile(id, `template.pdf?safeMarginMm=${margin}`).expect(422);
    }
  });

  it('is not there for a hand count, nor for whom patterns are not open', async () => {
    const handCount = { pieces: 21, widthMm: '279.4', heightMm: '330.2' };
    const counted = { layoutBy: 'hand count' as const, outline: null, container: null, handCount };
    const { id } = await added('Counted', counted);
    for (const file of ['template.svg', 'template.pdf']) {
      const reply = await shop.as('owner').get(`/api/patterns/${id}/${file}`).expect(404);
      expect(reply.body.detail).toContain('Draw the outline in it first.');
      await shop.as('bookkeeper').get(`/api/patterns/${id}/${file}`).expect(403);
      await shop.nobody().get(`/api/patterns/${id}/${file}`).expect(401);
      await shop.as('maker').get(`/api/patterns/999999/${file}`).expect(404);
    }
  });
});

describe('a layout to print', () => {
  it('is one sheet with a panel and its pieces, drawn to one scale', async () => {
    const pattern = await added('Printed', {
      outline: { shape: 'rectangle', widthMm: '60', heightMm: '40', cornerRadiusMm: '0' },
      container: { form: 'panel', widthMm: '300', heightMm: '200' },
      spacingMm: '0',
      trimMm: '0',
    });
    const pdf = await fileOf(pattern.id, 'layout.pdf');
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(pageCount(pdf)).toBe(1);
    expect(pattern.layout.pieces).toBe(25);
  });

  it('is not there for a hand count', async () => {
    const handCount = { pieces: 21, widthMm: '279.4', heightMm: '330.2' };
    const counted = { layoutBy: 'hand count' as const, handCount, outline: null, container: null };
    const pattern = await added('By hand', counted);
    const { body } = await shop
      .as('maker')
      .get(`/api/patterns/${pattern.id}/layout.pdf`)
      .expect(404);
    expect(body.detail).toContain('Draw its outline first');
  });
});
