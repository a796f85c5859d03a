import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeBareJob } from '../../testing/bare-job.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, reading, theProgram, type Work } from '../../work.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { adjustStock, receiveStock, returnStock, takeStock, undoReceipt } from './stock-ledger.ts';
import { StockMovement } from './stock-movement.entity.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let jobId: number;
let made = 0;

beforeAll(async () => {
  shop = await startTestShop();
  jobId = await writeBareJob(shop.context, 1);
});
afterAll(() => shop.close());

const doing = <T>(useCase: (work: Work) => Promise<T>) =>
  inTransaction(shop.context, theProgram, useCase);

async function valueBy(stockValue: 'moving average' | 'first in first out') {
  const { body } = await shop.as('owner').get('/api/workshop').expect(200);
  const change = shop.as('owner').patch('/api/workshop').set('If-Match', `"${body.version}"`);
  await change.send({ stockValue }).expect(200);
}

async function newHardware(): Promise<number> {
  return doing(async (work) => {
    const hardware = work.em.create(Hardware, {
      name: `Buckle ${++made}`,
      kind: 'hardware',
      unitPrice: new Decimal(20),
    });
    await work.em.flush();
    return hardware.id;
  });
}

const buy = (hardwareId: number, quantity: number, each: number) =>
  doing((work) =>
    receiveStock(work, { hardwareId, quantity, value: new Decimal(each).times(quantity) }),
  );

const use = async (hardwareId: number, quantity: number) =>
  (await doing((work) => takeStock(work, { jobId, hardwareId, quantity }))).value
    .negated()
    .toFixed(2);

const worth = (hardwareId: number) =>
  reading(shop.context, theProgram, async ({ em }) => {
    const movements = await em.find(StockMovement, { hardwareId });
    return movements.reduce((sum, { value }) => sum.plus(value), new Decimal(0)).toFixed(2);
  });

/** OpenStax, Principles of Accounting 1: Financial Accounting (2019), §10.3, perpetual. */
async function bookExample() {
  const hardwareId = await newHardware();
  await buy(hardwareId, 150, 21);
  const first = await use(hardwareId, 120);
  await buy(hardwareId, 225, 27);
  const second = await use(hardwareId, 180);
  await buy(hardwareId, 210, 33);
  const sold = new Decimal(first).plus(second).toFixed(2);
  return { sold, left: await worth(hardwareId) };
}

describe('what stock is worth', () => {
  it('is the book’s first in, first out, through the ledger', async () => {
    await valueBy('first in first out');
    expect(await bookExample()).toEqual({ sold: '7200.00', left: '8955.00' });
  });

  it('is the book’s moving average, through the ledger', async () => {
    await valueBy('moving average');
    expect(await bookExample()).toEqual({ sold: '7252.94', left: '8902.06' });
  });

  it.each([
    ['first in first out', ['100.00', '500.00']],
    ['moving average', ['300.00', '300.00']],
  ] as const)(
    'by %s, takes a delivery that cost something else out of the newest',
    async (method, costs) => {
      await valueBy(method);
      const hardwareId = await newHardware();
      await buy(hardwareId, 100, 1);
      await buy(hardwareId, 100, 3);
      const paid = { hardwareId, quantity: 100 };
      await doing((work) => undoReceipt(work, { ...paid, value: new Decimal(300) }));
      expect(await worth(hardwareId)).toBe('100.00');
      await buy(hardwareId, 100, 5);
      expect([await use(hardwareId, 100), await use(hardwareId, 100)]).toEqual(costs);
      expect(await worth(hardwareId)).toBe('0.00');
    },
  );

  it('begins, once the other way is chosen, with what the ledger says is there', async () => {
    await valueBy('moving average');
    const hardwareId = await newHardware();
    await buy(hardwareId, 100, 1);
    await buy(hardwareId, 100, 3);
    expect(await use(hardwareId, 100)).toBe('200.00');
    await valueBy('first in first out');
    await buy(hardwareId, 100, 5);
    expect(await use(hardwareId, 150)).toBe('450.00');
    await valueBy('moving average');
    expect(await use(hardwareId, 50)).toBe('250.00');
    expect(await worth(hardwareId)).toBe('0.00');
  });

  it.each(['moving average', 'first in first out'] as const)(
    'comes back from a job, by %s, at what it left for',
    async (method) => {
      await valueBy(method);
      const hardwareId = await newHardware();
      await buy(hardwareId, 3, 1);
      expect(await use(hardwareId, 3)).toBe('3.00');
      await buy(hardwareId, 10, 9);
      const returned = await doing((work) => returnStock(work, { jobId, hardwareId, quantity: 2 }));
      expect(returned.value.toFixed(2)).toBe('2.00');
    },
  );

  it.each([
    ['moving average', '4.00'],
    ['first in first out', '6.00'],
  ] as const)('of what is found more is, by %s, %s', async (method, value) => {
    await valueBy(method);
    const hardwareId = await newHardware();
    await buy(hardwareId, 1, 1);
    await buy(hardwareId, 1, 3);
    const { movement } = await doing((work) =>
      adjustStock(work, { hardwareId, counted: 4, reason: 'counted' }),
    );
    expect(movement?.value.toFixed(2)).toBe(value);
  });

  const deed = fc.record({
    verb: fc.constantFrom('buy', 'use', 'count'),
    quantity: fc.integer({ min: 1, max: 30 }),
    cents: fc.integer({ min: 0, max: 999 }),
  });

  it.each(['moving average', 'first in first out'] as const)(
    'by %s never falls below nothing, and is nothing where nothing is left',
    async (method) => {
      await valueBy(method);
      await fc.assert(
        fc.asyncProperty(fc.array(deed, { minLength: 1, maxLength: 12 }), async (deeds) => {
          const hardwareId = await newHardware();
          let there = 0;
          for (const { verb, quantity, cents } of deeds) {
            const item = { hardwareId };
            if (verb === 'buy') await buy(hardwareId, quantity, cents / 100);
            if (verb === 'use' && there >= quantity) await use(hardwareId, quantity);
            if (verb === 'count')
              await doing((work) => adjustStock(work, { ...item, counted: quantity, reason: 'x' }));
            if (verb === 'buy') there += quantity;
            if (verb === 'use' && there >= quantity) there -= quantity;
            if (verb === 'count') there = quantity;
            expect(Number(await worth(hardwareId))).toBeGreaterThanOrEqual(0);
          }
          if (there > 0) await use(hardwareId, there);
          expect(await worth(hardwareId)).toBe('0.00');
        }),
        { numRuns: 15 },
      );
    },
  );
});
