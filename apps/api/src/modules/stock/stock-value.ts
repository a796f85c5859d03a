import { Decimal } from 'decimal.js';
import { costOfOldest, Exact, round, stockLayers, type StockLayer } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { describeItem } from './described-item.ts';
import { keysOf, type StockItem } from './stock-item.ts';

/*
 * What stock is worth when it moves. A lot stands at its own cost; hardware and supplies at their moving average, or
 * first in, first out, as the shop chooses. A movement keeps the value that it was given, so that what is on hand is
 * always worth the sum of its movements; a choice made later holds for what moves later, and what is there at that
 * moment is then the oldest layer, at what the ledger says it is worth.
 */

interface Held {
  onHand: number;
  value: Decimal;
}

/** What the ledger says is on hand of an item, and what it is worth. */
async function heldOf(em: EntityManager, item: StockItem): Promise<Held> {
  const { lotId, hardwareId } = keysOf(item);
  const [row] = await em.execute<[{ quantity: number; value: number }]>(
    `SELECT COALESCE(SUM(quantity), 0) AS quantity, COALESCE(SUM(value), 0) AS value
     FROM stock_movement WHERE lot_id IS ? AND hardware_id IS ?`,
    [lotId, hardwareId],
  );
  return { onHand: row.quantity, value: unscaled(row.value, 2) };
}

/** The share of a cost that falls to a part, to the cent: all of it falls to the whole. */
export function shareOfCost(part: number, whole: { of: number; cost: Decimal }): Decimal {
  return round(new Exact(part).times(whole.cost).dividedBy(whole.of), 2);
}

/** What a quantity that goes is worth, to the cent: taking all that is left takes the last cent with it. */
export async function costOfGoing(
  em: EntityManager,
  item: StockItem,
  quantity: number,
): Promise<Decimal> {
  const after = await firstInFirstOutAfter(em, item);
  if (after !== undefined) {
    const layers = await layersOf(em, keysOf(item).hardwareId, after);
    return unscaled(costOfOldest(layers, quantity), 2);
  }
  const { onHand, value } = await heldOf(em, item);
  return onHand > 0 ? shareOfCost(quantity, { of: onHand, cost: value }) : new Decimal(0);
}

/**
 * What a quantity that was found is worth: as what is there, or, first in, first out, as what came last; with nothing
 * there, what it cost when it was bought.
 */
export async function costOfComing(
  em: EntityManager,
  item: StockItem,
  quantity: number,
): Promise<Decimal> {
  const after = await firstInFirstOutAfter(em, item);
  if (after !== undefined) {
    const newest = (await layersOf(em, keysOf(item).hardwareId, after)).at(-1);
    if (newest)
      return shareOfCost(quantity, { of: newest.quantity, cost: unscaled(newest.value, 2) });
  }
  const { onHand, value } = await heldOf(em, item);
  if (onHand > 0) return shareOfCost(quantity, { of: onHand, cost: value });
  const { unitCost } = await describeItem(em, item);
  return shareOfCost(quantity, { of: 1, cost: unitCost });
}

/** The ledger's last row before first in, first out began; undefined where the item is not valued so. */
async function firstInFirstOutAfter(
  em: EntityManager,
  { hardwareId }: StockItem,
): Promise<number | undefined> {
  if (typeof hardwareId !== 'number') return undefined;
  const workshop = await em.findOne(Workshop, 1);
  return workshop?.stockValue === 'first in first out' ? workshop.stockValueAfter : undefined;
}

/** What is left of each receipt since then; what was there before is the first. */
async function layersOf(
  em: EntityManager,
  hardwareId: number | null,
  after: number,
): Promise<StockLayer[]> {
  const rows = await em.execute<(StockLayer & { undoes: number })[]>(
    `SELECT * FROM (
       SELECT 0 AS id, COALESCE(SUM(quantity), 0) AS quantity, COALESCE(SUM(value), 0) AS value, 0 AS undoes
         FROM stock_movement WHERE hardware_id = ? AND id <= ?
       UNION ALL
       SELECT id, quantity, value, kind = 'receive' AND quantity < 0 FROM stock_movement
         WHERE hardware_id = ? AND id > ?)
     WHERE quantity <> 0 ORDER BY id`,
    [hardwareId, after, hardwareId, after],
  );
  return stockLayers(rows.map((row) => ({ ...row, undoes: row.undoes === 1 })));
}
