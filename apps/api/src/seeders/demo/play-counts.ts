import { approveCount } from '../../flows/approve-count.ts';
import { enterCount } from '../../flows/enter-count.ts';
import { handInCount } from '../../flows/hand-in-count.ts';
import { openCount } from '../../flows/open-count.ts';
import { findCount, linesOf } from '../../modules/counts/find-count.ts';
import { freeOf } from '../../modules/stock/stock-ledger.ts';
import { itemOf } from '../../modules/stock/stock-item.ts';
import type { Work } from '../../work.ts';
import type { DemoShop } from './demo-shop.ts';
import type { Year } from './year.ts';

/** Supplies were counted and approved some weeks ago, a few missing; the rack is being counted when the year ends. */
export function planCounts(shop: DemoShop, year: Year): void {
  let supplies = 0;
  year.plan(24, '15:10', () =>
    shop.as('maker', async (work) => {
      supplies = await countSupplies(work);
    }),
  );
  year.plan(24, '16:40', () => shop.as('owner', (work) => approveIt(work, supplies)));
  year.plan(0, '07:20', () => shop.as('maker', countSomeOfTheRack));
}

async function countSupplies(work: Work): Promise<number> {
  const id = await openCount(work, { of: 'supplies' });
  for (const [at, line] of (await linesOf(work.em, id)).entries()) {
    const { onHand } = await freeOf(work.em, itemOf(line));
    // Of the first, a few went astray.
    const quantity = at === 0 ? Math.max(0, onHand - 2) : onHand;
    await enterCount(work, { id, lineId: line.id }, { quantity, secondsAgo: 0 });
  }
  await handInCount(work, id, false);
  return id;
}

async function approveIt(work: Work, id: number): Promise<void> {
  const { version } = await findCount(work.em, id);
  await approveCount(work, { id, ifMatch: version });
}

async function countSomeOfTheRack(work: Work): Promise<void> {
  const id = await openCount(work, { of: 'place', place: 'rack 1' });
  for (const line of (await linesOf(work.em, id)).slice(0, 2)) {
    await enterCount(work, { id, lineId: line.id }, { unmeasured: true, secondsAgo: 0 });
  }
}
