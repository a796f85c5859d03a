import { Decimal } from 'decimal.js';
import { drawNumber } from '../../db/counters.ts';
import type { Work } from '../../work.ts';
import { Posting } from './posting.entity.ts';

type Side = [account: Posting['account'], amount: Decimal];

interface Entry {
  day: string;
  invoiceId: number;
  paymentId: number | null;
  /** What an account gains is positive, what it gives is negative. */
  sides: Side[];
}

/**
 * Writes one double entry: its sides sum to nought. A side of nought is left out.
 * @throws {RangeError} when the sides do not balance
 */
export async function postEntry(work: Work, { sides, ...entry }: Entry): Promise<void> {
  const balance = sides.reduce((sum, [, amount]) => sum.plus(amount), new Decimal(0));
  if (!balance.isZero())
    throw new RangeError(`The sides of an entry differ by ${balance.toString()}`);
  const number = await drawNumber(work.em, 'entry');
  for (const [account, amount] of sides) {
    if (amount.isZero()) continue;
    work.em.create(Posting, {
      ...entry,
      entry: number,
      account,
      amount,
      at: work.now.toISOString(),
    });
  }
  await work.em.flush();
}
