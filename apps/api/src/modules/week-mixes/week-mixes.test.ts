import type { WeekMixReply, WeekStart } from '@hidewright/contract';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  readyForTheBench,
  setBenchHours,
  takenOn,
  ticketOf,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterAll(() => ready.shop.close());

const run = {
  name: 'Coasters',
  kind: 'run',
  benchMinutes: '180',
  deskMinutes: '60',
  left: '240',
  mostPerWeek: '4',
  leastPerWeek: '0',
};
const bag = {
  ...run,
  name: 'Weekend bag',
  kind: 'large piece',
  benchMinutes: '900',
  left: '480',
  mostPerWeek: null,
};
const week = { hoursPerWeek: '40', deskHoursPerWeek: '4', incomeNeeded: '1500' };
const mixOf = (change: object = {}) =>
  ready.shop
    .as('owner')
    .post('/api/week-mixes')
    .send({ ...week, kinds: [run, bag], ...change });

describe('a week’s mix', () => {
  it('is what leaves most, with what one more hour is worth beside the average one', async () => {
    const mix = (await mixOf().expect(200)).body as WeekMixReply;
    // 36 h: 4 runs of 4 h at 60 an hour, and 20 h of bags at 30.
    expect(mix).toMatchObject({
      kinds: [
        { name: 'Coasters', units: '4', left: '960.00', at: 'most' },
        { name: 'Weekend bag', units: '1.25', left: '600.00', at: null },
      ],
      left: '1560.00',
      averagePerHour: '39.00',
      oneMoreHour: { left: '30.00', into: ['Weekend bag'] },
      income: { reached: true, short: '0.00', hoursShort: null },
    });
    // 60 r + 30 (36 − r) = 1,500: the income is reached with 14 hours of runs.
    expect(mix.largePieces).toEqual({ hours: '20', atMost: '22' });
  });

  it('says what is short, and which hours would do', async () => {
    const { body } = await mixOf({ incomeNeeded: '1800' }).expect(200);
    expect(body.income).toMatchObject({ reached: false, short: '240.00', hoursShort: '8' });
  });

  it('names what to change where more is promised than there are hours for', async () => {
    const { body } = await mixOf({ kinds: [run, { ...bag, leastPerWeek: '3' }] }).expect(422);
    expect(body.errors).toEqual([
      {
        field: 'hoursPerWeek',
        message:
          'What is promised takes 48 h a week, and 36 h are there. Promise less, first of all Weekend bag (48 h), or find 12 h more.',
      },
    ]);
  });

  it.each([
    ['kinds.0.benchMinutes', { kinds: [{ ...run, benchMinutes: '0' }] }],
    ['kinds.0.left', { kinds: [{ ...run, left: '1e3' }] }],
    ['kinds.0.leastPerWeek', { kinds: [{ ...run, leastPerWeek: '5' }] }],
    ['kinds.0.name', { kinds: [{ ...run, name: '' }] }],
    ['kinds', { kinds: [] }],
    ['hoursPerWeek', { hoursPerWeek: '0' }],
    ['deskHoursPerWeek', { deskHoursPerWeek: '40' }],
    ['incomeNeeded', { incomeNeeded: '-5' }],
  ])('refuses a wrong %s', async (field, change) => {
    const { body } = await mixOf(change).expect(422);
    expect(body.errors).toMatchObject([{ field }]);
  });

  it('is for the owner alone', async () => {
    for (const role of ['maker', 'bookkeeper'] as const) {
      await ready.shop.as(role).get('/api/week-mixes/start').expect(403);
      await ready.shop.as(role).post('/api/week-mixes').send({}).expect(403);
    }
  });

  it('takes many kinds of work at once', async () => {
    const kinds = Array.from({ length: 40 }, (_, at) => ({ ...run, left: String(240 + at) }));
    const { body } = await mixOf({ kinds }).expect(200);
    // 9 of the 160 that could be sold, from the one that leaves most downwards.
    expect((body as WeekMixReply).kinds.slice(37).map(({ units }) => units)).toEqual([
      '1',
      '4',
      '4',
    ]);
    await mixOf({ kinds: [...kinds, run] }).expect(422);
  });
});

describe('what a week’s mix begins with', () => {
  const start = async () =>
    (await ready.shop.as('owner').get('/api/week-mixes/start').expect(200)).body as WeekStart;

  it('is the shop’s hours and target while no run is finished', async () => {
    await setBenchHours(ready, '6');
    expect(await start()).toEqual({
      week: { hoursPerWeek: '30', deskHoursPerWeek: '0', incomeNeeded: '1800.00', kinds: [] },
      wagePerHour: '22.00',
      from: { runs: 0, weeks: 4 },
    });
  });

  it('is then what the runs of a pattern took and left, and can be worked out at once', async () => {
    const order = await takenOn(ready);
    const ticket = await ticketOf(ready, order);
    const log = (name: string, counts: object) =>
      ready.shop
        .as('maker')
        .post(`/api/jobs/${ticket.id}/logs`)
        .send({ stepId: ticket.steps.find((step) => step.name === name)?.id, ...counts })
        .expect(201);
    await log('Stamp', { good: 50, minutes: '70' });
    await log('Cut', { good: 50, minutes: '50' });
    const maker = ready.shop.as('maker');
    await maker.post(`/api/jobs/${ticket.id}/finish`).send({ good: 50 }).expect(201);
    const { week: begun, from } = await start();
    expect(from).toEqual({ runs: 1, weeks: 4 });
    expect(begun.kinds).toEqual([
      {
        name: 'Round coaster',
        kind: 'run',
        benchMinutes: '120',
        deskMinutes: '45',
        left: expect.stringMatching(/^\d+\.\d\d$/) as string,
        mostPerWeek: '0.25',
        leastPerWeek: '0',
      },
    ]);
    // Two hours were logged: Today says of the same run what one of them left.
    const today = await ready.shop.as('owner').get('/api/today').expect(200);
    const anHour = Number(today.body.earned.jobs[0].perBenchHour);
    expect(Number(begun.kinds[0]?.left)).toBeCloseTo(2 * anHour, 1);
    // 30 bench hours, and 45 minutes of desk time in four weeks.
    expect(begun.hoursPerWeek).toBe('30.2');
    const { body } = await ready.shop.as('owner').post('/api/week-mixes').send(begun).expect(200);
    expect((body as WeekMixReply).kinds[0]).toMatchObject({ units: '0.25', at: 'most' });
  });
});
