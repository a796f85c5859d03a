import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface PromiseInput {
  onHand: number;
  /** expected per period, 0 or more */
  receipts: readonly number[];
  /** promised to customers per period, 0 or more; as many periods as receipts */
  orders: readonly number[];
}

/**
 * What is still free to promise, per period: discrete available-to-promise (APICS dictionary, from
 * memory). The first period has what is on hand and its receipt, less the orders before the next
 * receipt; every later receipt has itself less the orders from it to the next; null where nothing is
 * received. Where orders exceed a receipt, the lack is made good from the receipts before it, the
 * nearest first; what even they lack stands below 0 in the first period.
 * @throws InvalidInput
 */
export function availableToPromise({ onHand, receipts, orders }: PromiseInput): (number | null)[] {
  readNumber(onHand, 'onHand', { min: 0 });
  if (receipts.length === 0) {
    throw new InvalidInput('receipts', 'Give the receipts of at least one period.');
  }
  if (orders.length !== receipts.length) {
    throw new InvalidInput('orders', 'Give as many orders as receipts, one for each period.');
  }
  const net = netPerReceipt(onHand, receipts, orders);
  return makeGood(net).map((free) => free?.toNumber() ?? null);
}

function netPerReceipt(
  onHand: number,
  receipts: readonly number[],
  orders: readonly number[],
): (Decimal | null)[] {
  const net: (Decimal | null)[] = [];
  let last = 0;
  receipts.forEach((each, at) => {
    const receipt = new Exact(readNumber(each, `receipts.${at}`, { min: 0 }));
    const order = readNumber(orders[at], `orders.${at}`, { min: 0 });
    const begins = at === 0 || receipt.gt(0);
    if (begins) last = at;
    net.push(begins ? receipt.plus(at === 0 ? onHand : 0) : null);
    net[last] = net[last]?.minus(order) ?? null;
  });
  return net;
}

function makeGood(net: readonly (Decimal | null)[]): (Decimal | null)[] {
  let lack = new Exact(0);
  return net
    .toReversed()
    .map((free, fromLast) => {
      if (!free) return null;
      const left = free.minus(lack);
      const isFirst = fromLast === net.length - 1;
      lack = left.lt(0) ? left.neg() : new Exact(0);
      return left.lt(0) && !isFirst ? new Exact(0) : left;
    })
    .toReversed();
}
