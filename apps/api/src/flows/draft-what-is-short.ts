import type { GoodsLineTyped } from '@hidewright/contract';
import { draftPurchaseOrder } from '../modules/purchase-orders/draft-purchase-order.ts';
import type { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import { sayDay } from '../say-day.ts';
import type { Work } from '../work.ts';
import { buyingNotes, customersBring } from './check/buying-notes.ts';
import type { CheckedRun, CheckedRuns } from './check/checked-runs.ts';
import { lackingOf, type Lacking } from './check/lacking.ts';
import { sayFor } from './check/run-reply.ts';
import { boughtLine, unpricedNote } from './order-suggestions/bought-line.ts';

interface Drafted {
  orders: PurchaseOrder[];
  notes: string[];
}

/** One thing to buy, for one or several of the runs. */
interface ToDraft {
  name: string;
  line: GoodsLineTyped;
  supplierId: number;
  runs: CheckedRun[];
}

/**
 * Drafts an order to each supplier with what is short and on no draft yet, at the terms that what to order goes by,
 * and keeps for which runs. Pressed again, it drafts nothing more, and says where it is.
 */
export async function draftWhatIsShort(work: Work, checked: CheckedRuns): Promise<Drafted> {
  const lacking = lackingOf(checked);
  const say = await sayFor(work.em);
  const all = lacking.flatMap(toDraft);
  return {
    orders: await draftEach(work, all),
    notes: [
      ...lacking.flatMap((each) => buyingNotes(each, say)),
      ...all.flatMap(({ name, line }) => unpricedNote(name, line)),
      ...customersBring(checked.runs),
    ],
  };
}

function toDraft({ buying, toBuy, runs, ...thing }: Lacking): ToDraft[] {
  const { supplierId, terms } = buying;
  if (toBuy === null || supplierId === null) return [];
  const line = boughtLine(thing, terms, toBuy.quantity);
  return [{ name: thing.name, line, supplierId, runs }];
}

async function draftEach(work: Work, all: readonly ToDraft[]): Promise<PurchaseOrder[]> {
  const orders: PurchaseOrder[] = [];
  for (const supplierId of new Set(all.map((each) => each.supplierId))) {
    const own = all.filter((each) => each.supplierId === supplierId);
    orders.push(
      await draftPurchaseOrder(
        work,
        {
          supplierId,
          // Worked out when it is sent, from whatever is on it by then.
          expectedOn: null,
          note: '',
          lines: own.map(({ line }) => line),
        },
        sayRuns([...new Set(own.flatMap(({ runs }) => runs))]),
      ),
    );
  }
  return orders;
}

/** Q-0007, packed by Mon 14 Dec 2026; Round coaster, packed by Wed 16 Dec 2026 */
const sayRuns = (runs: readonly CheckedRun[]): string =>
  runs.map(({ planned }) => `${planned.paper}, packed by ${sayDay(planned.by)}`).join('; ');
