import type { Sourcing, Dated } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { ItemSource } from '../order-suggestions/item-sources.ts';

export interface Wanted {
  leatherIds: readonly number[];
  hardwareIds: readonly number[];
}

interface LineRow {
  leather_id: number | null;
  hardware_id: number | null;
  number: string;
  state: 'draft' | 'sent' | 'part received';
  expected_on: string | null;
  open: number;
}

export interface OnOrder {
  /** Expected with a day that is not over. */
  receipts: Dated[];
  /** Papers that should have come by now, or name no day: not counted on. */
  overdue: string[];
  drafted: number;
  drafts: string[];
}

type Item = { leatherId: number } | { hardwareId: number };

/** What is on order and on drafts, item by item; quantities as the ledger keeps them. */
export async function readOnOrder(
  em: EntityManager,
  today: string,
  { leatherIds, hardwareIds }: Wanted,
): Promise<(item: Item) => OnOrder> {
  const rows = await em.execute<LineRow[]>(
    `SELECT l.leather_id, l.hardware_id, p.number, p.state, COALESCE(l.expected_on, p.expected_on) AS expected_on, l.quantity - l.received AS open
    FROM purchase_order p JOIN purchase_line l ON l.purchase_order_id = p.id
    WHERE p.state IN ('draft', 'sent', 'part received') AND l.received < l.quantity AND l.closed = 0
      AND (l.leather_id IN (SELECT value FROM json_each(?)) OR l.hardware_id IN (SELECT value FROM json_each(?)))
    ORDER BY p.id, l.position`,
    [JSON.stringify(leatherIds), JSON.stringify(hardwareIds)],
  );
  return (item) =>
    toOnOrder(
      rows.filter((row) =>
        'leatherId' in item
          ? row.leather_id === item.leatherId
          : row.hardware_id === item.hardwareId,
      ),
      today,
    );
}

function toOnOrder(rows: readonly LineRow[], today: string): OnOrder {
  const sent = rows.filter(({ state }) => state !== 'draft');
  const drafts = rows.filter(({ state }) => state === 'draft');
  const numbers = (some: readonly LineRow[]) => [...new Set(some.map(({ number }) => number))];
  return {
    receipts: sent.flatMap(({ expected_on: day, open, number }) =>
      day !== null && day >= today ? [{ day, quantity: open, paper: number }] : [],
    ),
    overdue: numbers(sent.filter(({ expected_on: day }) => day === null || day < today)),
    drafted: drafts.reduce((sum, { open }) => sum + open, 0),
    drafts: numbers(drafts),
  };
}

/** Who sells it as what to order has it, and what is drafted there; nobody sells what the customer brings. */
export function buyingFrom(
  { supplier, terms, arrivesOn }: ItemSource,
  { drafted, drafts, overdue }: OnOrder,
  { fromCustomer }: { fromCustomer: boolean } = { fromCustomer: false },
): Sourcing {
  const seller = fromCustomer
    ? { supplierId: null, supplier: null, arrivesOn: null }
    : { supplierId: supplier?.id ?? null, supplier: supplier?.name ?? null, arrivesOn };
  return { ...seller, terms, drafted, drafts, overdue };
}
