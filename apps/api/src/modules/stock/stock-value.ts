import { Decimal } from 'decimal.js';
import { costOfOldest, Exact, round } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import type { StockItem } from './stock-item.ts';
import { readValueFacts, type ValueFacts } from './value-facts.ts';

/*
 * What stock is worth when it moves. A lot stands at its own cost; hardware and supplies at their moving average, or
 * first in, first out, as the shop chooses. A movement keeps the value that it was given, so that what is on hand is
 * always worth the sum of its movements; a choice made later holds for what moves later, and what is there at that
 * moment is then the oldest layer, at what the ledger says it is worth.
 */

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
  const factsOf = await readValueFacts(em, [item]);
  return going(factsOf(item), quantity);
}

/** What a change of what is on hand is worth, signed like it, to the cent. */
export async function costOfChange(
  em: EntityManager,
  item: StockItem,
  change: number,
): Promise<Decimal> {
  const costOf = await costsOfChanges(em, [{ item, change }]);
  return costOf(item, change);
}

interface StockChange {
  item: StockItem;
  /** Above 0 what was found, below 0 what is gone. */
  change: number;
}

/** The same of any number of them, read at once; nothing is read for those that change nothing. */
export async function costsOfChanges(
  em: EntityManager,
  changes: readonly StockChange[],
): Promise<(item: StockItem, change: number) => Decimal> {
  const moved = changes.filter(({ change }) => change !== 0).map(({ item }) => item);
  const factsOf = await readValueFacts(em, moved);
  return (item, change) => {
    if (change === 0) return new Decimal(0);
    return change < 0 ? going(factsOf(item), -change).negated() : coming(factsOf(item), change);
  };
}

function going({ layers, onHand, value }: ValueFacts, quantity: number): Decimal {
  if (layers !== undefined) return unscaled(costOfOldest(layers, quantity), 2);
  return onHand > 0 ? shareOfCost(quantity, { of: onHand, cost: value }) : new Decimal(0);
}

/**
 * What a quantity that was found is worth: as what is there, or, first in, first out, as what came last; with nothing
 * there, what it cost when it was bought.
 */
function coming({ layers, onHand, value, unitCost }: ValueFacts, quantity: number): Decimal {
  const newest = layers?.at(-1);
  if (newest)
    return shareOfCost(quantity, { of: newest.quantity, cost: unscaled(newest.value, 2) });
  if (onHand > 0) return shareOfCost(quantity, { of: onHand, cost: value });
  return shareOfCost(quantity, { of: 1, cost: unitCost });
}
