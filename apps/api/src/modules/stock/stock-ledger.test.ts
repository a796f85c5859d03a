import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeBareJob } from '../../testing/bare-job.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, reading, theProgram, type Work } from '../../work.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { Lot } from '../lots/lot.entity.ts';
import { Reservation } from './reservation.entity.ts';
import { StockBalance } from './stock-balance.entity.ts';
import { keysOf, type StockItem } from './stock-item.ts';
import {
  adjustStock,
  freeOf,
  receiveStock,
  releaseReservations,
  reserveStock,
  returnStock,
  takeStock,
} from './stock-ledger.ts';
import { StockMovement } from './stock-movement.entity.ts';

const footage = 92_903_040;

interface Deed {
  verb: 'receive' | 'reserve' | 'take' | 'return' | 'adjust' | 'release';
  quantity: number;
  job: number;
}

describe('the stock ledger', () => {
  let shop: Awaited<ReturnType<typeof startTestShop>>;
  let first: number;
  let second: number;
  let made = 0;

  beforeAll(async () => {
    shop = await startTestShop();
    first = await writeBareJob(shop.context, 1);
    second = await writeBareJob(shop.context, 2);
  });
  afterAll(() => shop.close());

  const doing = <T>(useCase: (work: Work) => Promise<T>) =>
    inTransaction(shop.context, theProgram, useCase);
  const free = (item: StockItem) => reading(shop.context, theProgram, ({ em }) => freeOf(em, item));

  function rivets(onHand: number, unitPrice = '0.17') {
    return doing(async (work) => {
      const hardware = work.em.create(Hardware, {
        name: `Rivet ${++made}`,
        kind: 'hardware',
        unitPrice: new Decimal(unitPrice),
      });
      await work.em.flush();
      const item = { hardwareId: hardware.id };
      const value = new Decimal(unitPrice).times(onHand).toDecimalPlaces(2);
      if (onHand > 0) await receiveStock(work, { ...item, quantity: onHand, value });
      return item;
    });
  }

  function side(ft2: number, cost: string) {
    return doing(async (work) => {
      const leather = work.em.create(Leather, {
        name: `Oak tan ${++made}`,
        pricePerFt2: new Decimal(9),
      });
      await work.em.flush();
      const lot = work.em.create(Lot, {
        tag: `T-9${made}`,
        leatherId: leather.id,
        form: 'side',
        measuredAreaMm2: new Decimal(ft2).times('92903.04'),
        cost: new Decimal(cost),
        receivedOn: work.today,
      });
      await work.em.flush();
      await receiveStock(work, {
        lotId: lot.id,
        quantity: ft2 * footage,
        value: new Decimal(cost),
      });
      return { lotId: lot.id };
    });
  }

  const valueOf = (item: StockItem) =>
    reading(shop.context, theProgram, async ({ em }) => {
      const movements = await em.find(StockMovement, keysOf(item));
      return movements.reduce((sum, { value }) => sum.plus(value), new Decimal(0)).toFixed(2);
    });

  it('holds for a job only what is free, and says how much that is', async () => {
    const item = await rivets(1000);
    await doing((work) => reserveStock(work, { jobId: first, ...item, quantity: 700 }));
    await expect(
      doing((work) => reserveStock(work, { jobId: second, ...item, quantity: 301 })),
    ).rejects.toMatchObject({
      status: 409,
      message: expect.stringContaining('There is 300 of'),
    });
    expect(await free(item)).toEqual({ onHand: 1000, reserved: 700, free: 300 });
  });

  it('takes what is held for the job first, then what is free, and nothing held for another', async () => {
    const item = await rivets(1000);
    await doing((work) => reserveStock(work, { jobId: first, ...item, quantity: 400 }));
    await doing((work) => reserveStock(work, { jobId: second, ...item, quantity: 500 }));
    await doing((work) => takeStock(work, { jobId: first, ...item, quantity: 450 }));
    expect(await free(item)).toEqual({ onHand: 550, reserved: 500, free: 50 });
    await expect(
      doing((work) => takeStock(work, { jobId: first, ...item, quantity: 51 })),
    ).rejects.toMatchObject({
      status: 409,
    });
    await expect(
      doing((work) => takeStock(work, { jobId: null, ...item, quantity: 51 })),
    ).rejects.toMatchObject({
      status: 409,
    });
    expect(await free(item)).toEqual({ onHand: 550, reserved: 500, free: 50 });
  });

  it('names an area in the shop’s unit when a lot has too little', async () => {
    const item = await side(24, '216.00');
    const taking = doing((work) =>
      takeStock(work, { jobId: first, ...item, quantity: 25 * footage }),
    );
    await expect(taking).rejects.toThrow(
      /There is 24 ft² of lot T-\d+ to be had, and 25 ft² was asked for/,
    );
  });

  it('values a part of a lot by its area, and the last part takes the last cent', async () => {
    const item = await side(3, '10.00');
    const takeAFoot = () =>
      doing((work) => takeStock(work, { jobId: first, ...item, quantity: footage }));
    await takeAFoot();
    await takeAFoot();
    await takeAFoot();
    const values = await reading(shop.context, theProgram, ({ em }) =>
      em.find(StockMovement, { ...keysOf(item), kind: 'take' }, { orderBy: { id: 'asc' } }),
    );
    expect(values.map(({ value }) => value.toFixed(2))).toEqual(['-3.33', '-3.34', '-3.33']);
    expect(await valueOf(item)).toBe('0.00');
  });

  it('values hardware at its unit price, and at the average once it was bought at two prices', async () => {
    const item = await rivets(100, '0.20');
    await doing((work) =>
      receiveStock(work, { ...item, quantity: 100, value: new Decimal('30.00') }),
    );
    const taken = await doing((work) => takeStock(work, { jobId: first, ...item, quantity: 100 }));
    expect(taken.value.toFixed(2)).toBe('-25.00');
    expect(await valueOf(item)).toBe('25.00');
  });

  it('takes back from a job no more than it took', async () => {
    const item = await rivets(100);
    await doing((work) => takeStock(work, { jobId: first, ...item, quantity: 60 }));
    await doing((work) => returnStock(work, { jobId: first, ...item, quantity: 20 }));
    await expect(
      doing((work) => returnStock(work, { jobId: first, ...item, quantity: 41 })),
    ).rejects.toMatchObject({
      status: 409,
      message: expect.stringContaining('has taken 40'),
    });
    expect((await free(item)).onHand).toBe(60);
  });

  it('lets an honest count leave less than is held, and names the reservations', async () => {
    const item = await rivets(100);
    await doing((work) => reserveStock(work, { jobId: first, ...item, quantity: 80 }));
    const { movement, broken } = await doing((work) =>
      adjustStock(work, { ...item, counted: 70, reason: 'counted' }),
    );
    expect(movement).toMatchObject({ kind: 'adjust', quantity: -30 });
    expect(broken).toMatchObject([{ jobId: first, open: 80 }]);
    expect(await free(item)).toEqual({ onHand: 70, reserved: 80, free: 0 });
    await doing((work) => takeStock(work, { jobId: first, ...item, quantity: 70 }));
    await expect(
      doing((work) => takeStock(work, { jobId: first, ...item, quantity: 1 })),
    ).rejects.toMatchObject({
      status: 409,
    });
  });

  it('writes no movement for a count that agrees', async () => {
    const item = await rivets(100);
    const { movement } = await doing((work) =>
      adjustStock(work, { ...item, counted: 100, reason: 'counted' }),
    );
    expect(movement).toBeNull();
  });

  it('lets go of what a job still holds, and of nothing else', async () => {
    const item = await rivets(100);
    await doing((work) => reserveStock(work, { jobId: first, ...item, quantity: 40 }));
    await doing((work) => reserveStock(work, { jobId: second, ...item, quantity: 30 }));
    await doing((work) => takeStock(work, { jobId: first, ...item, quantity: 10 }));
    await doing((work) => releaseReservations(work, first));
    expect(await free(item)).toEqual({ onHand: 90, reserved: 30, free: 60 });
  });

  it.each([0, -1, 1.5, Number.NaN, Number.POSITIVE_INFINITY])(
    'refuses a quantity of %s',
    async (quantity) => {
      const item = await rivets(10);
      const deeds: ((
        work: Work,
        asked: { jobId: number; hardwareId: number; quantity: number },
      ) => Promise<unknown>)[] = [reserveStock, takeStock, returnStock];
      for (const deed of deeds) {
        await expect(
          doing((work) => deed(work, { jobId: first, ...item, quantity })),
        ).rejects.toMatchObject({ status: 422 });
      }
      await expect(
        doing((work) => receiveStock(work, { ...item, quantity, value: new Decimal(1) })),
      ).rejects.toMatchObject({
        status: 422,
      });
    },
  );

  it('says that there is no such lot', async () => {
    await expect(
      doing((work) => takeStock(work, { jobId: first, lotId: 999, quantity: 1 })),
    ).rejects.toMatchObject({
      status: 404,
    });
  });

  it('never changes or removes a movement', async () => {
    await rivets(10);
    const connection = shop.context.orm.em.fork().getConnection();
    await expect(connection.execute('UPDATE stock_movement SET quantity = 11')).rejects.toThrow(
      /append-only/,
    );
    await expect(connection.execute('DELETE FROM stock_movement')).rejects.toThrow(/append-only/);
  });

  const deed: fc.Arbitrary<Deed> = fc.record({
    verb: fc.constantFrom<Deed['verb'][]>(
      'receive',
      'reserve',
      'take',
      'return',
      'adjust',
      'release',
    ),
    quantity: fc.integer({ min: 1, max: 40 }),
    job: fc.constantFrom(1, 2),
  });

  it('keeps balances equal to what is written, whatever is done', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(deed, { minLength: 1, maxLength: 12 }), async (deeds) => {
        const item = await rivets(30);
        for (const each of deeds)
          await doing((work) => perform(work, item, each)).catch(onlyRefusals);
        await reading(shop.context, theProgram, ({ em }) => expectAgreement(em, item));
        await doing(async (work) => {
          await releaseReservations(work, first);
          await releaseReservations(work, second);
        });
      }),
      { numRuns: 25 },
    );
  });

  function perform(
    work: Work,
    item: { hardwareId: number },
    { verb, quantity, job }: Deed,
  ): Promise<unknown> {
    const asked = { ...item, jobId: job, quantity };
    switch (verb) {
      case 'receive':
        return receiveStock(work, {
          ...item,
          quantity,
          value: new Decimal('0.19').times(quantity),
        });
      case 'reserve':
        return reserveStock(work, asked);
      case 'take':
        return takeStock(work, asked);
      case 'return':
        return returnStock(work, asked);
      case 'adjust':
        return adjustStock(work, { ...item, counted: quantity, reason: 'counted' });
      default:
        return releaseReservations(work, job);
    }
  }
});

function onlyRefusals(error: unknown): void {
  expect(error).toMatchObject({ status: 409 });
}

async function expectAgreement(em: Work['em'], item: StockItem): Promise<void> {
  const movements = await em.find(StockMovement, keysOf(item));
  const held = await em.find(Reservation, keysOf(item));
  const balance = await em.findOneOrFail(StockBalance, keysOf(item));
  expect(balance.onHand).toBe(movements.reduce((sum, { quantity }) => sum + quantity, 0));
  expect(balance.reserved).toBe(held.reduce((sum, { open }) => sum + open, 0));
  const value = movements.reduce((sum, movement) => sum.plus(movement.value), new Decimal(0));
  expect(value.isNegative()).toBe(false);
  if (balance.onHand === 0) expect(value.toFixed(2)).toBe('0.00');
}
