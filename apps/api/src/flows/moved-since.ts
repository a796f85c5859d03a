import type { StockMovement } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { wrongState } from '../http/problem.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { readMovements } from '../modules/stock/read-ledger.ts';
import { keysOf, type StockItem } from '../modules/stock/stock-item.ts';
import { freeOf } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';

const fewEnoughToRead = 3;

const verbs: Record<StockMovement['kind'], string> = {
  receive: 'received',
  take: 'took',
  return: 'put back',
  reject: 'rejected',
  adjust: 'adjusted it by',
  count: 'counted it, by',
};

/**
 * What is measured stands against the books that were looked at then.
 * @throws {Problem} 409 naming what moved since, and what the books say now
 */
export async function requireOnHand(work: Work, item: StockItem, seen: number): Promise<void> {
  const { onHand } = await freeOf(work.em, item);
  if (onHand === seen) return;
  const { name, say } = await describeItem(work.em, item);
  const { lotId, hardwareId } = keysOf(item);
  const newest = await readMovements(work.em, {
    lotId: lotId ?? undefined,
    hardwareId: hardwareId ?? undefined,
    limit: fewEnoughToRead,
  });
  const moved = sinceSeen(newest, onHand, seen).map((movement) => inWords(movement, say));
  throw wrongState(
    `${name.charAt(0).toUpperCase()}${name.slice(1)} has moved since you looked: ${moved.join('; ')}. The books say ${say(onHand)} now, not ${say(seen)}. Nothing is set. See whether your figure still holds, then set it again.`,
    ['set it again'],
  );
}

/** The movements, newest first, back to where the books said what was seen. */
function sinceSeen(newest: StockMovement[], onHand: number, seen: number): StockMovement[] {
  let stood = onHand;
  const from = newest.findIndex((movement) => {
    stood -= quantityOf(movement);
    return stood === seen;
  });
  return from === -1 ? newest : newest.slice(0, from + 1);
}

const quantityOf = ({ areaMm2, quantity }: StockMovement): number =>
  areaMm2 === null ? (quantity ?? 0) : scaled(new Decimal(areaMm2), 3);

function inWords(movement: StockMovement, say: (quantity: number) => string): string {
  const { kind, actorName, reason } = movement;
  const quantity = quantityOf(movement);
  const signed = kind === 'adjust' || kind === 'count';
  const sign = signed ? (quantity < 0 ? '−' : '+') : '';
  const why = reason === '' ? '' : ` (${reason})`;
  return `${actorName} ${verbs[kind]} ${sign}${say(Math.abs(quantity))}${why}`;
}
