import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Pattern, RunsCheck } from '@hidewright/contract';
import { agreedQuote, readyForTheBench, takenOn, ticketOf } from '../testing/bench-shop.ts';
import { startTestShop } from '../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let ready: Awaited<ReturnType<typeof readyForTheBench>>;
let cap: number;
let post: number;
let kit: number;

beforeAll(async () => {
  shop = await startTestShop();
  ready = await readyForTheBench(shop);
  cap = await add({ name: 'Cap 9 mm', unitPrice: '0.06' });
  post = await add({
    name: 'Post 8 mm',
    unitPrice: '0.05',
    postLengthMm: '8',
    stackMinMm: '5',
    stackMaxMm: '6.5',
  });
  kit = await add({
    name: 'Rivet in two',
    unitPrice: '0',
    priceFromParts: true,
    settingDie: 'SD-9',
    parts: [
      { hardwareId: cap, quantity: 1 },
      { hardwareId: post, quantity: 1 },
    ],
  });
  const hardware = [
    { hardwareId: cap, quantity: 150 },
    { hardwareId: post, quantity: 120 },
  ];
  await owner().post('/api/receipts').send({ hardware }).expect(201);
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const add = async (body: object): Promise<number> =>
  (await owner().post('/api/hardware').send(body).expect(201)).body.id;
const reservedOf = async (id: number): Promise<number> =>
  (await owner().get(`/api/hardware/${id}`).expect(200)).body.reserved;

/** The first run's answers. */
async function said(runs: object[]): Promise<RunsCheck['runs'][number]> {
  const { body } = await shop.as('maker').post('/api/checks').send({ runs }).expect(200);
  return (body as RunsCheck).runs[0]!;
}

async function change(path: string, body: object) {
  const { version } = (await owner().get(`/api/${path}`).expect(200)).body as { version: number };
  return owner().patch(`/api/${path}`).set('If-Match', `"${version}"`).send(body).expect(200);
}

async function changePattern(differs: (before: Pattern) => object): Promise<Pattern> {
  const path = `patterns/${ready.patternId}`;
  const before = (await owner().get(`/api/${path}`).expect(200)).body as Pattern;
  const definition = { ...before.definition, ...differs(before) };
  return (await change(path, { definition })).body;
}

describe('a kit on a pattern', () => {
  it('is costed, checked, held and taken as its parts', async () => {
    await changePattern(() => ({ hardware: [{ hardwareId: kit, perPiece: 2 }] }));
    const quote = await agreedQuote(ready, 50);
    const check = await owner().get(`/api/quotes/${quote.id}/check?quantity=50`).expect(200);
    const names = check.body.answers.map((answer: { name: string }) => answer.name);
    expect(names).toEqual(expect.arrayContaining(['Cap 9 mm', 'Post 8 mm']));
    expect(names).not.toContain('Rivet in two');
    const ticket = await ticketOf(ready, await takenOn(ready, 50));
    expect(ticket.hardware).toMatchObject([
      { name: 'Cap 9 mm', needed: 100, held: 100 },
      { name: 'Post 8 mm', needed: 100, held: 100 },
    ]);
    expect([await reservedOf(cap), await reservedOf(post)]).toEqual([100, 100]);
    const taking = { hardwareId: post, quantity: 100 };
    await owner().post(`/api/jobs/${ticket.id}/takings`).send(taking).expect(201);
    expect([await reservedOf(cap), await reservedOf(post)]).toEqual([100, 0]);
  });

  it('says what speaks against setting it through the folded leather', async () => {
    await change(`hardware/${kit}`, { settingDieHere: false });
    const unsaid = await changePattern(() => ({ hardware: [{ hardwareId: kit, perPiece: 1 }] }));
    const die = 'It is set with the die SD-9, which is not in the shop.';
    expect(unsaid.hardware).toMatchObject([{ remarks: [die] }]);
    await change(`leathers/${ready.leatherId}`, { weightLowOz: '5', weightHighOz: '6' });
    const { body } = await owner().get(`/api/patterns/${ready.patternId}`).expect(200);
    expect(body.hardware[0].remarks).toEqual([
      die,
      'Post 8 mm: The post is 8 mm and holds 5 to 6.5 mm. Two layers of 5 to 6 oz are 4 to 4.8 mm: up to 1 mm too thin. Take a shorter one, or add a layer.',
    ]);
    const three = await changePattern(() => ({
      hardware: [{ hardwareId: kit, perPiece: 1, layers: 3 }],
    }));
    expect(three.hardware[0]?.remarks[1]).toContain('Three layers');
    const check = await said([{ patternId: ready.patternId, quantity: 20, by: '2026-12-18' }]);
    expect(check.remarks[0]).toMatch(/^Rivet in two: Post 8 mm: The post is 8 mm .* Three layers/);
    expect(check.answers.find(({ name }) => name === 'Post 8 mm')?.enough).toBe(true);
    expect(check.answers.find(({ name }) => name === 'Setting die SD-9')).toMatchObject({
      about: 'tooling',
      hardwareId: kit,
      enough: false,
      sentence:
        'Setting die SD-9: not in the shop yet. It sets Rivet in two. Order it, or say at Rivet in two that you have it.',
    });
  });
});

describe('lots that have a weight of their own', () => {
  const heavy =
    'Rivet in two: Post 8 mm: The post is 8 mm and holds 5 to 6.5 mm. Three layers of lot OT-140, at 8 oz, are 9.5 mm: 3 mm too thick. Take a longer one, or fewer layers. Or cut from another lot.';
  let lotId: number;
  const weigh = (weightOz: string | null) => change(`lots/${lotId}`, { weightOz });
  const misfits = async () => {
    const run = { patternId: ready.patternId, quantity: 50, by: '2026-12-18' };
    const { lots, remarks } = await said([run]);
    expect(lots.map(({ tag }) => tag)).toEqual(['OT-140']);
    return remarks.filter((remark) => remark.startsWith('Rivet in two'));
  };

  it('are what the check holds the hardware against, in place of the leather’s range', async () => {
    await change(`leathers/${ready.leatherId}`, { weightLowOz: '5', weightHighOz: '6' });
    await changePattern(() => ({ hardware: [{ hardwareId: kit, perPiece: 1, layers: 3 }] }));
    const side = { leatherId: ready.leatherId, form: 'side', measuredAreaMm2: '4000000' };
    const lots = [{ ...side, tag: 'OT-140', cost: '400.00' }];
    const { body } = await owner().post('/api/receipts').send({ lots }).expect(201);
    lotId = body.lots[0].id;
    expect((await misfits())[0]).toContain('Three layers of 5 to 6 oz');
    await weigh('8');
    expect(await misfits()).toEqual([heavy]);
    await weigh('5');
    expect(await misfits()).toEqual([]);
  });

  it('are warned of on the ticket where the hardware does not fit them, and stop nothing', async () => {
    await weigh('8');
    const ticket = await ticketOf(ready, await takenOn(ready, 50, { evenIfShort: true }));
    expect(ticket.lots.map(({ tag, misfits: said }) => [tag, said])).toEqual([
      ['OT-140', [heavy]],
      ['OT-118', []],
    ]);
    const taking = { lotId, areaMm2: '1000' };
    await owner().post(`/api/jobs/${ticket.id}/takings`).send(taking).expect(201);
  });
});

describe('hardware that is set before the last pieces fail', () => {
  const sentenceOf = ({ answers }: RunsCheck['runs'][number], of: string) =>
    answers.find(({ name }) => name === of)?.sentence;

  it('is checked, held and listed with an allowance for losses where its step is known', async () => {
    const ring = await add({ name: 'Split ring', unitPrice: '0.07' });
    const buckle = await add({ name: 'Buckle', unitPrice: '0.60' });
    const dye = await add({ name: 'Dye', kind: 'supplies', unit: 'ml', unitPrice: '0.04' });
    const hardware = [ring, buckle, dye].map((id) => ({ hardwareId: id, quantity: 130 }));
    await owner().post('/api/receipts').send({ hardware }).expect(201);
    await changePattern(() => ({
      hardware: [
        { hardwareId: ring, perPiece: 2, fromStep: 0 },
        { hardwareId: buckle, perPiece: 1 },
        { hardwareId: dye, perPiece: 1 },
      ],
    }));
    const asked = { patternId: ready.patternId, quantity: 50, by: '2026-12-18' };
    const check = await said([asked]);
    const { cutCount } = check;
    expect(cutCount).toBeGreaterThan(51);
    const more = cutCount - 50;
    expect(sentenceOf(check, 'Split ring')).toBe(
      `Split ring: take ${2 * cutCount} of 130 free. ${2 * more} of the ${2 * cutCount} are for losses.`,
    );
    expect(sentenceOf(check, 'Buckle')).toBe('Buckle: take 50 of 130 free.');
    expect(check).toMatchObject({
      patternId: ready.patternId,
      remarks: [
        `${more} more pieces are cut than ordered, and no spares of Buckle are counted for them: the pattern does not say from when on it is needed. Lay some by, or say it on the pattern.`,
      ],
    });
    const quote = await agreedQuote(ready, 50);
    expect((await said([{ quoteId: quote.id }])).remarks).toEqual([
      `${more} more pieces are cut than ordered, and no spares of Buckle are counted for them: the pattern as quoted does not say from when on it is needed. Lay some by. Say it on the pattern, and the next quote counts them.`,
    ]);
    const ticket = await ticketOf(ready, await takenOn(ready, 50, { evenIfShort: true }));
    expect(ticket.hardware.find(({ name }) => name === 'Split ring')).toMatchObject({
      needed: 2 * cutCount,
      held: 2 * cutCount,
    });
    expect(await reservedOf(ring)).toBe(2 * cutCount);
  });

  it('has its allowance where an option adds it and says its step, or puts it in another’s place', async () => {
    const charm = await add({ name: 'Charm', unitPrice: '0.30' });
    const hook = await add({ name: 'Hook', unitPrice: '0.40' });
    const hardware = [charm, hook].map((id) => ({ hardwareId: id, quantity: 130 }));
    await owner().post('/api/receipts').send({ hardware }).expect(201);
    const withCharm = (fromStep: number | null) =>
      changePattern(() => ({
        hardware: [{ hardwareId: cap, perPiece: 1, fromStep: 0 }],
        options: [
          {
            name: 'Charmed',
            swaps: [
              { hardwareId: null, byHardwareId: charm, perPiece: 1, fromStep },
              { hardwareId: cap, byHardwareId: hook, perPiece: 1 },
            ],
          },
        ],
      }));
    const asked = { patternId: ready.patternId, quantity: 50, by: '2026-12-18', option: 'Charmed' };
    const needed = ({ answers }: RunsCheck['runs'][number], of: string) =>
      Number(answers.find(({ name }) => name === of)?.needed);
    await withCharm(null);
    const unsaid = await said([asked]);
    const { cutCount } = unsaid;
    expect([needed(unsaid, 'Charm'), needed(unsaid, 'Hook')]).toEqual([50, cutCount]);
    expect(unsaid.remarks.join()).toContain('no spares of Charm are counted');
    await withCharm(0);
    const mended = await said([asked]);
    expect([needed(mended, 'Charm'), needed(mended, 'Hook')]).toEqual([cutCount, cutCount]);
    expect(mended.remarks).toEqual([]);
    const terms = { options: [{ name: 'Charmed', typedExtra: null }] };
    const quoted = await agreedQuote(ready, 50, { terms });
    const fromQuote = await said([{ quoteId: quoted.id, option: 'Charmed', quantity: 50 }]);
    expect(needed(fromQuote, 'Charm')).toBe(cutCount);
    await changePattern(() => ({ options: [] }));
  });

  it('has its allowance in every part of a kit, and no remark where nothing fails', async () => {
    await changePattern(() => ({ hardware: [{ hardwareId: kit, perPiece: 1, fromStep: 0 }] }));
    const asked = { patternId: ready.patternId, quantity: 20, by: '2026-12-18' };
    const check = await said([asked]);
    for (const part of ['Cap 9 mm', 'Post 8 mm'])
      expect(sentenceOf(check, part)).toContain(
        ` ${check.cutCount - 20} of the ${check.cutCount} are for losses.`,
      );
    const work = { kind: 'minutesPer100', minutes: '60', rejectPercent: '0' };
    await changePattern(() => ({ hardware: [{ hardwareId: kit, perPiece: 1 }], work }));
    expect((await said([asked])).remarks.join()).not.toContain('spares');
  });
});

describe('supplies that are kept in stock', () => {
  it('are counted by the hundred, checked, held, and learned in the same measure', async () => {
    const dye = await add({ name: 'Edge dye', kind: 'supplies', unit: 'ml', unitPrice: '0.04' });
    const hardware = [{ hardwareId: dye, quantity: 40 }];
    await owner().post('/api/receipts').send({ hardware }).expect(201);
    await changePattern(() => ({
      hardware: [{ hardwareId: dye, perPiece: 45, per: 'hundred' }],
    }));
    const quote = await agreedQuote(ready, 50);
    const { body } = await owner().get(`/api/quotes/${quote.id}/check?quantity=50`).expect(200);
    const said = body.answers.find((answer: { name: string }) => answer.name === 'Edge dye');
    // 22.5 ml are counted as 23.
    expect(said).toMatchObject({ about: 'supplies', needed: '23', freeNow: '23', short: '0' });
    const ticket = await ticketOf(ready, await takenOn(ready, 50, { evenIfShort: true }));
    expect(ticket.hardware).toMatchObject([{ name: 'Edge dye', needed: 23, held: 23 }]);
    const taking = { hardwareId: dye, quantity: 25 };
    await owner().post(`/api/jobs/${ticket.id}/takings`).send(taking).expect(201);
    await owner().post(`/api/jobs/${ticket.id}/finish`).send({ good: 50 }).expect(201);
    const learned = await owner().get(`/api/patterns/${ready.patternId}/learned`).expect(200);
    expect(learned.body.hardware).toMatchObject([
      {
        name: 'Edge dye',
        per: 'hundred',
        said: 45,
        found: '50',
        losses: { needed: 23, taken: 25 },
      },
    ]);
  });
});
