import type { Decimal } from 'decimal.js';
import { Exact, round } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { keysOf, type StockItem } from './stock-item.ts';

/** What the ledger says is on hand of an item, at cost: the sum of its movements. */
export async function valueOnHand(em: EntityManager, item: StockItem): Promise<Decimal> {
  const { lotId, hardwareId } = keysOf(item);
  const [row] = await em.execute<[{ value: number }]>(
    'SELECT COALESCE(SUM(value), 0) AS value FROM stock_movement WHERE lot_id IS ? AND hardware_id IS ?',
    [lotId, hardwareId],
  );
  return unscaled(row.value, 2);
}

/**
 * The cost of a quantity that comes or goes, to the cent: its share of what is on hand, so that taking all that is
 * left takes the last cent with it; with nothing on hand, what it cost when it was bought.
 */
export function shareOfCost(
  quantity: number,
  held: { onHand: number; value: Decimal; unitCost: Decimal },
): Decimal {
  const whole = new Exact(quantity);
  const exact =
    held.onHand > 0 ? whole.times(held.value).dividedBy(held.onHand) : whole.times(held.unitCost);
  return round(exact, 2);
}
