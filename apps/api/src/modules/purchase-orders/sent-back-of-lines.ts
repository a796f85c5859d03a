import type { EntityManager } from '@mikro-orm/sqlite';

/** What went back of a line: thousandths of mm², or pieces, and on which days first and last. */
interface SentBack {
  quantity: number;
  firstOn: string;
  lastOn: string;
}

/** By the line's id. */
export type SentBackOfLines = ReadonlyMap<number, SentBack>;

/** Lots go back by the line that they came on, hardware by the first line that ordered it. */
const ofLine = `CASE WHEN m.lot_id IS NULL
  THEN (SELECT n.id FROM purchase_line n WHERE n.purchase_order_id = m.purchase_order_id AND n.hardware_id = m.hardware_id
    ORDER BY n.position LIMIT 1)
  ELSE (SELECT l.purchase_line_id FROM receipt_line l WHERE l.lot_id = m.lot_id) END`;

export async function readSentBack(
  em: EntityManager,
  orderIds: readonly number[],
): Promise<SentBackOfLines> {
  if (orderIds.length === 0) return new Map();
  const rows = await em.execute<({ lineId: number | null } & SentBack)[]>(
    `SELECT ${ofLine} AS lineId, -SUM(m.quantity) AS quantity, MIN(m.day) AS firstOn, MAX(m.day) AS lastOn
     FROM stock_movement m
     WHERE m.kind = 'reject' AND m.purchase_order_id IN (${orderIds.map(() => '?').join(', ')}) GROUP BY lineId`,
    [...orderIds],
  );
  return new Map(
    rows.flatMap(({ lineId, ...back }) => (lineId === null ? [] : [[lineId, back] as const])),
  );
}
