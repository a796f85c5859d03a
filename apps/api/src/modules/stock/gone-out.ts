import type { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';

interface GoneOut {
  /** Thousandths of mm². */
  quantity: number;
  /** What it had cost when it went. */
  value: Decimal;
}

/** What went out for a service on an order's line and was not put back on its lot since. */
export async function readGoneOut(em: EntityManager, purchaseLineId: number): Promise<GoneOut> {
  const [row] = await em.execute<[{ quantity: number; value: number }]>(
    `SELECT COALESCE(-SUM(quantity), 0) AS quantity, COALESCE(-SUM(value), 0) AS value
     FROM stock_movement WHERE purchase_line_id = ?`,
    [purchaseLineId],
  );
  return { quantity: row.quantity, value: unscaled(row.value, 2) };
}
