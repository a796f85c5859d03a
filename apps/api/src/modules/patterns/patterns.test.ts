import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Pattern as PatternReply } from '@hidewright/contract';
import { coaster } from '../../testing/example-pattern.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { Activity } from '../activity/activity.entity.ts';
import { PatternVersion } from './pattern-version.entity.ts';
import { Pattern } from './pattern.entity.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let leatherId: number;
let hardwareId: number;

beforeAll(async () => {
  shop = await startTestShop();
  const leather = await shop
    .as('owner')
    .post('/api/leathers')
    .send({ name: 'Oak tan 5–6 oz', pricePerFt2: '9.5' });
  leatherId = leather.body.id;
  const rivet = { name: 'Rivet 9 mm', kind: 'hardware', unitPrice: '0.17' };
  hardwareId = (await shop.as('owner').post('/api/hardware').send(rivet).expect(201)).body.id;
});
afterAll(() => shop.close());

let made = 0;
async function addPattern(change: Parameters<typeof coaster>[1] = {}): Promise<PatternReply> {
  made += 1;
  const body = { name: `Coaster ${made}`, definition: coaster(leatherId, change) };
  return (await shop.as('owner').post('/api/patterns').send(body).expect(201)).body as PatternReply;
}

const change = (pattern: PatternReply, body: object, version = pattern.version) =>
  shop.as('owner').patch(`/api/patterns/${pattern.id}`).set('If-Match', `"${version}"`).send(body);

const faultsOf = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);

describe('a pattern', () => {
  it('is kept as designed, with names, a drawing and its layout', async () => {
    const pattern = await addPattern({ hardware: [{ hardwareId, perPiece: 2 }] });
    expect(pattern).toMatchObject({
      versionNumber: 1,
      leatherName: 'Oak tan 5–6 oz',
      description: 'round, 95 mm',
    });
    expect(pattern.hardware).toEqual([
      { hardwareId, perPiece: 2, per: 'piece', name: 'Rivet 9 mm', unit: 'piece', remarks: [] },
    ]);
    expect(pattern.layout.pieces).toBeGreaterThan(0);
    expect(pattern.outlinePath).toMatch(/^M /);
    const read = await shop.as('maker').get(`/api/patterns/${pattern.id}`).expect(200);
    expect(read.body).toEqual(pattern);
    expect(read.headers.etag).toBe(`"${pattern.version}"`);
  });

  it('carries steps as they were typed', async () => {
    const steps = [
      {
        name: 'Strike',
        per: 'strike' as const,
        setupMinutes: '20',
        secondsPerUnit: '25',
        rejectPercent: '4',
      },
      {
        name: 'Cut',
        per: 'piece' as const,
        setupMinutes: '5',
        secondsPerUnit: '12.5',
        rejectPercent: '0.5',
      },
    ];
    const { definition } = await addPattern({ work: { kind: 'steps', steps } });
    expect(definition.work).toEqual({ kind: 'steps', steps });
  });

  it('keeps waits, supplies and options, and tells the maker no cost of them', async () => {
    const { id, definition } = await addPattern({
      hardware: [{ hardwareId, perPiece: 2, fromStep: 0, lossPercent: '2' }],
      supplies: [{ name: 'Edge dye', cost: '1.8', per: 'hundred' }],
      options: [{ name: 'Plain', swaps: [{ hardwareId, byHardwareId: null, perPiece: 1 }] }],
      work: {
        kind: 'steps',
        secondsPercent: '2',
        steps: [
          {
            name: 'Dye',
            per: 'piece',
            setupMinutes: '5',
            secondsPerUnit: '24',
            rejectPercent: '2',
            shortestWait: '60',
            pieceRate: '0.2',
          },
        ],
      },
    });
    expect(definition).toMatchObject({
      supplies: [{ cost: '1.8' }],
      work: { secondsPercent: '2' },
    });
    const { body } = await shop.as('maker').get(`/api/patterns/${id}`).expect(200);
    expect(body.definition.supplies).toEqual([{ name: 'Edge dye', per: 'hundred' }]);
    expect(body.definition.work.steps[0]).toMatchObject({ shortestWait: '60' });
    expect(body.definition.work.steps[0].pieceRate).toBeUndefined();
  });

  it('stays as it was in earlier versions when it changes', async () => {
    const pattern = await addPattern();
    const wider = coaster(leatherId, { outline: { shape: 'round', diameterMm: '101.6' } });
    const { body } = await change(pattern, { definition: wider }).expect(200);
    expect(body).toMatchObject({ versionNumber: 2, description: 'round, 101.6 mm' });
    expect(body.layout.pieces).toBeLessThanOrEqual(pattern.layout.pieces);
    const { body: history } = await shop
      .as('maker')
      .get(`/api/patterns/${pattern.id}/versions`)
      .expect(200);
    expect(history.items.map((each: { number: number }) => each.number)).toEqual([2, 1]);
    expect(history.items[1].definition).toEqual(pattern.definition);
  });

  it('gets no new version for a new name, for putting it away, or for saying the same again', async () => {
    const pattern = await addPattern();
    const renamed = (await change(pattern, { name: 'Beer mat' }).expect(200)).body;
    expect(renamed).toMatchObject({ name: 'Beer mat', versionNumber: 1 });
    const away = (await change(renamed, { active: false }).expect(200)).body;
    const same = (await change(away, { definition: pattern.definition }).expect(200)).body;
    expect(same).toEqual(away);
    expect(await shop.context.orm.em.fork().count(PatternVersion, { patternId: pattern.id })).toBe(
      1,
    );
    const deeds = await shop.context.orm.em
      .fork()
      .find(Activity, { subjectKind: 'pattern', subjectId: pattern.id });
    expect(deeds.map(({ action }) => action)).toEqual([
      `added pattern ${pattern.name}`,
      'changed pattern Beer mat',
      'changed pattern Beer mat',
    ]);
  });

  it('is listed newest first, with its yield, found by name, page by page', async () => {
    const [first, second] = [await addPattern(), await addPattern({ spacingMm: '4' })];
    const page = (query: string) => shop.as('maker').get(`/api/patterns?${query}`).expect(200);
    const { body } = await page('limit=1');
    expect(body.items[0]).toMatchObject({
      id: second.id,
      pieces: second.layout.pieces,
      form: 'panel',
    });
    const { body: next } = await page(`limit=1&cursor=${body.next}`);
    expect(next.items[0].id).toBe(first.id);
    const { body: found } = await page(`q=${encodeURIComponent(first.name)}&active=yes`);
    expect(found.items.map((each: { id: number }) => each.id)).toContain(first.id);
    expect((await page('active=no&q=Coaster')).body.items).toEqual([]);
  });

  it('keeps an honest layout of nothing, which no quote can be made of', async () => {
    const { id, layout } = await addPattern({ outline: { shape: 'round', diameterMm: '300' } });
    expect(layout).toMatchObject({ pieces: 0, placements: [] });
    const customer = await shop
      .as('owner')
      .post('/api/customers')
      .send({ name: 'An inn' })
      .expect(201);
    const quote = { customerId: customer.body.id, patternId: id, breaks: [{ quantity: 100 }] };
    const { body } = await shop.as('owner').post('/api/quotes').send(quote).expect(422);
    expect(faultsOf(body)).toEqual(['patternId']);
    expect(body.errors[0].message).toContain('Not one piece fits');
    expect((await shop.as('owner').get('/api/quotes')).body.items).toEqual([]);
  });

  it('leaves a quote the version that it was made with', async () => {
    const pattern = await addPattern();
    const customer = await shop
      .as('owner')
      .post('/api/customers')
      .send({ name: 'A brewery' })
      .expect(201);
    const asked = {
      customerId: customer.body.id,
      patternId: pattern.id,
      breaks: [{ quantity: 100 }],
    };
    const quote = (await shop.as('owner').post('/api/quotes').send(asked).expect(201)).body;
    await change(pattern, { definition: coaster(leatherId, { spacingMm: '12' }) }).expect(200);
    const { body } = await shop.as('owner').get(`/api/quotes/${quote.id}`).expect(200);
    expect(body).toMatchObject({ patternVersion: 1, layout: { pieces: pattern.layout.pieces } });
    expect(body.numbers).toEqual(quote.numbers);
  });

  it('is made once however often the same request comes', async () => {
    const body = { name: 'Once only', definition: coaster(leatherId) };
    const post = () =>
      shop.as('owner').post('/api/patterns').set('Idempotency-Key', 'once-only').send(body);
    const replies = await Promise.all([post(), post()]);
    expect(replies.map(({ status }) => status)).toEqual([201, 201]);
    expect(replies[0].body.id).toBe(replies[1].body.id);
    expect(await shop.context.orm.em.fork().count(Pattern, { name: 'Once only' })).toBe(1);
  });
});

describe('a change', () => {
  it('must say which version was read', async () => {
    const pattern = await addPattern();
    await shop.as('owner').patch(`/api/patterns/${pattern.id}`).send({ name: 'X' }).expect(428);
  });

  it('of a version that is no longer there is refused, with who changed it', async () => {
    const pattern = await addPattern();
    await change(pattern, { definition: coaster(leatherId, { spacingMm: '3' }) }).expect(200);
    const { body } = await change(pattern, {
      definition: coaster(leatherId, { spacingMm: '5' }),
    }).expect(412);
    expect(body.changed.by).toBe('The owner');
    expect(body.changed.what).toContain('version 2');
    expect(await shop.context.orm.em.fork().count(PatternVersion, { patternId: pattern.id })).toBe(
      2,
    );
  });
});

describe('a pattern is refused', () => {
  const step = {
    name: 'Cut',
    per: 'piece',
    setupMinutes: '0',
    secondsPerUnit: '12',
    rejectPercent: '0',
  };
  const swap = (hardwareId: number | null, byHardwareId: number | null) => ({
    hardwareId,
    byHardwareId,
    perPiece: 1,
  });
  it.each([
    ['without a leather', { leatherId: undefined }, 'definition.leatherId'],
    ['of a leather that is not there', { leatherId: 999_999 }, 'definition.leatherId'],
    [
      'with hardware that is not there',
      { hardware: [{ hardwareId: 999_999, perPiece: 1 }] },
      'definition.hardware.0.hardwareId',
    ],
    [
      'with none of a hardware',
      { hardware: [{ hardwareId: 1, perPiece: 0 }] },
      'definition.hardware.0.perPiece',
    ],
    [
      'with half a rivet',
      { hardware: [{ hardwareId: 1, perPiece: 0.5 }] },
      'definition.hardware.0.perPiece',
    ],
    [
      'with the same hardware twice',
      { hardware: [1, 2].map((perPiece) => ({ hardwareId: 1, perPiece })) },
      'definition.hardware.1.hardwareId',
    ],
    ['with negative spacing', { spacingMm: '-2' }, 'definition.spacingMm'],
    ['with a trim of NaN', { trimMm: Number.NaN }, 'definition.trimMm'],
    [
      'with no minutes',
      { work: { kind: 'minutesPer100', minutes: '0', rejectPercent: '10' } },
      'definition.work.minutes',
    ],
    [
      'with negative minutes',
      { work: { kind: 'minutesPer100', minutes: '-3', rejectPercent: '10' } },
      'definition.work.minutes',
    ],
    ['with no steps', { work: { kind: 'steps', steps: [] } }, 'definition.work.steps'],
    [
      'with a step that rejects everything',
      { work: { kind: 'steps', steps: [{ ...step, rejectPercent: '100' }] } },
      'definition.work.steps.0.rejectPercent',
    ],
    [
      'with a step per hour',
      { work: { kind: 'steps', steps: [{ ...step, per: 'hour' }] } },
      'definition.work.steps.0.per',
    ],
    [
      'with hardware for a step that is not there',
      { hardware: [{ hardwareId: 1, perPiece: 1, fromStep: 1 }] },
      'definition.hardware.0.fromStep',
    ],
    [
      'with an option that adds hardware for a step that is not there',
      { options: [{ name: 'Ringed', swaps: [{ ...swap(null, 1), fromStep: 1 }] }] },
      'definition.options.0.swaps.0.fromStep',
    ],
    [
      'with a longest wait that is over before the shortest',
      { work: { kind: 'steps', steps: [{ ...step, shortestWait: '60', longestWait: '30' }] } },
      'definition.work.steps.0.longestWait',
    ],
    [
      'with a supply that costs less than nothing',
      { supplies: [{ name: 'Dye', cost: '-1', per: 'run' }] },
      'definition.supplies.0.cost',
    ],
    [
      'with a supply per panel',
      { supplies: [{ name: 'Dye', cost: '1', per: 'panel' }] },
      'definition.supplies.0.per',
    ],
    [
      'with an option that changes nothing',
      { options: [{ name: 'Plain', swaps: [swap(null, null)] }] },
      'definition.options.0.swaps.0.hardwareId',
    ],
    [
      'with an option that leaves out what is not there',
      { options: [{ name: 'Plain', swaps: [swap(1, null)] }] },
      'definition.options.0.swaps.0.hardwareId',
    ],
    [
      'with an option that says another step than the line that it replaces',
      {
        hardware: [{ hardwareId: 1, perPiece: 1 }],
        options: [{ name: 'Brass', swaps: [{ ...swap(1, 2), fromStep: 0 }] }],
      },
      'definition.options.0.swaps.0.fromStep',
    ],
    [
      'with two options of one name',
      { options: [1, 2].map((id) => ({ name: 'Ringed', swaps: [swap(null, id)] })) },
      'definition.options.1.name',
    ],
    [
      'with a learning curve on which later pieces take no time',
      {
        work: {
          kind: 'minutesPer100',
          minutes: '90',
          rejectPercent: '5',
          learning: { model: 'unit', curvePercent: '50', measuredAt: 20 },
        },
      },
      'definition.work.learning.curvePercent',
    ],
    ['with an unknown field', { colour: 'brown' }, 'definition.colour'],
    [
      'with an outline that cannot be',
      { outline: { shape: 'oval', widthMm: '80', heightMm: '0' } },
      'definition.outline.heightMm',
    ],
  ])('%s', async (_what, wrong, field) => {
    const body = { name: 'Never there', definition: { ...coaster(leatherId), ...wrong } };
    const reply = await shop.as('owner').post('/api/patterns').send(body).expect(422);
    expect(faultsOf(reply.body)).toEqual([field]);
    expect(reply.body.errors[0].message).toMatch(/^[A-Za-z].{8,}\.$/);
    expect(await shop.context.orm.em.fork().count(Pattern, { name: 'Never there' })).toBe(0);
  });

  it('without a name, or with a name that is taken', async () => {
    const { name, id, version } = await addPattern();
    const post = (body: object) => shop.as('owner').post('/api/patterns').send(body).expect(422);
    expect(faultsOf((await post({ name: ' ', definition: coaster(leatherId) })).body)).toEqual([
      'name',
    ]);
    expect(faultsOf((await post({ name, definition: coaster(leatherId) })).body)).toEqual(['name']);
    const other = await addPattern();
    expect(faultsOf((await change(other, { name }).expect(422)).body)).toEqual(['name']);
    await shop
      .as('owner')
      .patch(`/api/patterns/${id}`)
      .set('If-Match', `"${version}"`)
      .send({ name })
      .expect(200);
  });

  it('to whom it is not open', async () => {
    const { id, version } = await addPattern();
    const body = { name: 'By another', definition: coaster(leatherId) };
    for (const role of ['maker', 'bookkeeper'] as const) {
      await shop.as(role).post('/api/patterns').send(body).expect(403);
      await shop
        .as(role)
        .patch(`/api/patterns/${id}`)
        .set('If-Match', `"${version}"`)
        .send({ name: 'Y' })
        .expect(403);
    }
    await shop.as('bookkeeper').get(`/api/patterns/${id}`).expect(403);
    await shop.nobody().get('/api/patterns').expect(401);
    await shop.as('owner').get('/api/patterns/999999').expect(404);
    await shop.as('owner').get('/api/patterns/one').expect(404);
  });

  it('and what the maker reads of it holds no price', async () => {
    const { id } = await addPattern();
    const { text } = await shop.as('maker').get(`/api/patterns/${id}`).expect(200);
    expect(text).not.toMatch(/price|cost/i);
  });
});
