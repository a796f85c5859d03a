import type { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import { sayDay } from '../say-day.ts';
import type { Work } from '../work.ts';
import { buyingNotes, customersBring } from './check/buying-notes.ts';
import type { CheckedRun, CheckedRuns } from './check/checked-runs.ts';
import { lackingOf, type Lacking } from './check/lacking.ts';
import { sayFor } from './check/run-reply.ts';
import type { MoreOf } from './order-suggestions/merged-line.ts';
import { putOnDraft } from './order-suggestions/put-on-draft.ts';

interface Drafted {
  orders: PurchaseOrder[];
  notes: string[];
}

/** One thing to buy, for one or several of the runs. */
interface ToDraft {
  thing: MoreOf;
  supplierId: number;
  runs: CheckedRun[];
}

/**
 * Puts what is short and on no draft yet on the draft to its supplier, or on a new one, at the terms that what to order
 * goes by, and keeps for which runs. Pressed again, it drafts nothing more, and says where it is.
 */
export async function draftWhatIsShort(work: Work, checked: CheckedRuns): Promise<Drafted> {
  const lacking = lackingOf(checked);
  const say = await sayFor(work.em);
  const { orders, notes } = await draftEach(work, lacking.flatMap(toDraft));
  return {
    orders,
    notes: [
      ...lacking.flatMap((each) => buyingNotes(each, say)),
      ...notes,
      ...customersBring(checked.runs),
    ],
  };
}

function toDraft({ of, id, name, unit, buying, toBuy, runs }: Lacking): ToDraft[] {
  const { supplierId, terms } = buying;
  if (toBuy === null || supplierId === null) return [];
  return [{ thing: { of, id, name, unit, terms, more: toBuy.quantity }, supplierId, runs }];
}

async function draftEach(work: Work, all: readonly ToDraft[]): Promise<Drafted> {
  const { areaUnit } = await work.em.findOneOrFail(Workshop, 1);
  const drafted: Drafted = { orders: [], notes: [] };
  for (const supplierId of new Set(all.map((each) => each.supplierId))) {
    const own = all.filter((each) => each.supplierId === supplierId);
    const { order, notes } = await putOnDraft(work, {
      supplierId,
      things: own.map(({ thing }) => thing),
      areaUnit,
      draftedFor: sayRuns([...new Set(own.flatMap(({ runs }) => runs))]),
    });
    drafted.orders.push(order);
    drafted.notes.push(...notes);
  }
  return drafted;
}

/** Q-0007, packed by Mon 14 Dec 2026; Round coaster, packed by Wed 16 Dec 2026 */
const sayRuns = (runs: readonly CheckedRun[]): string =>
  runs.map(({ planned }) => `${planned.paper}, packed by ${sayDay(planned.by)}`).join('; ');
