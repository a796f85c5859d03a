import type { Sourcing, Dated } from '@hidewright/domain';
import { addDays, addWorkdays, isWorkday } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Supplier } from '../../modules/suppliers/supplier.entity.ts';

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

/** Who sells it, and when it is here if it is ordered today: after their days, on a working day. */
export function buyingFrom(
  supplier: Supplier | undefined,
  today: string,
  { drafted, drafts, overdue }: OnOrder,
): Sourcing {
  return {
    supplier: supplier?.name ?? null,
    arrivesOn: supplier === undefined ? null : arrival(today, supplier.leadDays),
    drafted,
    drafts,
    overdue,
  };
}

function arrival(today: string, leadDays: number): string {
  const day = addDays(today, leadDays);
  return isWorkday(day) ? day : addWorkdays(day, 1);
}
