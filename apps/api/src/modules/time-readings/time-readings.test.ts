import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { TimeReadings } from '@hidewright/contract';
import { readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { finishedRun } from '../../testing/finished-run.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterAll(() => ready.shop.close());

const at = () => `/api/patterns/${ready.patternId}/time-readings`;
const as = (role: 'owner' | 'maker' | 'bookkeeper') => ready.shop.as(role);

describe('readings of a step', () => {
  it('are kept for the owner to see, whoever took them', async () => {
    const asked = { stepName: 'Cut', seconds: ['6.25', '7'] };
    await as('maker').post(at()).send(asked).expect(201);
    await as('owner')
      .post(at())
      .send({ stepName: 'Stamp', seconds: ['12'] })
      .expect(201);
    const { readings } = (await as('owner').get(at()).expect(200)).body as TimeReadings;
    expect(readings).toMatchObject([
      { stepName: 'Stamp', seconds: '12', personName: 'The owner' },
      { stepName: 'Cut', seconds: '7', personName: 'The maker' },
      { stepName: 'Cut', seconds: '6.25', personName: 'The maker' },
    ]);
  });

  it('stand beside what the tickets say: an average for each row of their logs', async () => {
    await finishedRun(ready, { Cut: { good: 50, minutes: '6' }, Stamp: { minutes: '20' } });
    const { logged } = (await as('maker').get(at()).expect(200)).body as TimeReadings;
    expect(logged).toMatchObject([
      { stepName: 'Cut', seconds: '7.2', units: 50, jobNumber: 'J-0001', personName: 'The maker' },
    ]);
  });

  it.each([
    ['stepName', { stepName: 'Juggle', seconds: ['4'] }],
    ['stepName', { stepName: '', seconds: ['4'] }],
    ['seconds', { stepName: 'Cut', seconds: [] }],
    ['seconds.1', { stepName: 'Cut', seconds: ['4', '0'] }],
    ['seconds.0', { stepName: 'Cut', seconds: ['4.333'] }],
  ])('are refused where %s makes no sense', async (field, body) => {
    const reply = await as('maker').post(at()).send(body).expect(422);
    expect(reply.body.errors).toContainEqual(expect.objectContaining({ field }));
  });

  it('are not for the bookkeeper, and nobody can change them', async () => {
    await as('bookkeeper').get(at()).expect(403);
    const connection = ready.shop.context.orm.em.getConnection();
    await expect(connection.execute('UPDATE time_reading SET seconds = 1')).rejects.toThrow(
      'append-only',
    );
  });
});
