import type { Dated } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';

interface Row {
  key: string;
  order_id: number;
  number: string;
  state: 'draft' | 'sent' | 'part received';
  expected_on: string | null;
  open: number;
}

/** What is still to come of a thing, and what waits on drafts; as the ledger counts. */
export interface OpenLines {
  /** Sent, whenever it is awaited. */
  onOrder: number;
  /** Of that, what is expected on a day that is not over. */
  receipts: Dated[];
  /** Papers that should have come by now, or name no day. */
  overdue: string[];
  drafted: number;
  drafts: { id: number; number: string }[];
}

const sql = `
  SELECT CASE WHEN l.hardware_id IS NULL THEN 'leather ' || l.leather_id ELSE 'hardware ' || l.hardware_id END AS key,
    p.id AS order_id, p.number, p.state, COALESCE(l.expected_on, p.expected_on) AS expected_on,
    l.quantity - l.received AS open
  FROM purchase_order p JOIN purchase_line l ON l.purchase_order_id = p.id
  WHERE p.state IN ('draft', 'sent', 'part received') AND l.closed = 0
    AND l.received < l.quantity ORDER BY p.id, l.position`;

export async function readOpenLines(
  em: EntityManager,
  today: string,
): Promise<(key: string) => OpenLines> {
  const byKey = new Map<string, Row[]>();
  for (const row of await em.execute<Row[]>(sql)) {
    byKey.set(row.key, [...(byKey.get(row.key) ?? []), row]);
  }
  return (key) => toOpenLines(byKey.get(key) ?? [], today);
}

function toOpenLines(rows: readonly Row[], today: string): OpenLines {
  const sent = rows.filter(({ state }) => state !== 'draft');
  const drafts = rows.filter(({ state }) => state === 'draft');
  const isExpected = ({ expected_on: day }: Row) => day !== null && day >= today;
  return {
    onOrder: openOf(sent),
    receipts: sent.filter(isExpected).map(({ expected_on: day, open, number }) => ({
      ...{ day: day ?? today, quantity: open, paper: number },
    })),
    overdue: [...new Set(sent.filter((row) => !isExpected(row)).map(({ number }) => number))],
    drafted: openOf(drafts),
    drafts: [...new Map(drafts.map(({ order_id: id, number }) => [id, number]))].map(
      ([id, number]) => ({ id, number }),
    ),
  };
}

const openOf = (rows: readonly Row[]): number => rows.reduce((sum, { open }) => sum + open, 0);
