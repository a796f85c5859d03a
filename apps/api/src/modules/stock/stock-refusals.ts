import { invalid, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { describeItem } from './described-item.ts';
import { holdersOf } from './holders-of.ts';
import type { StockItem } from './stock-item.ts';

/* What the ledger says when there is not enough. */

export async function tooLittle(
  work: Work,
  item: StockItem,
  { asked, most }: { asked: number; most: number },
) {
  const { name, say } = await describeItem(work.em, item);
  return wrongState(
    `There is ${say(most)} of ${name} to be had, and ${say(asked)} was asked for. Ask for less, or receive more first.`,
    most > 0 ? [`up to ${say(most)}`] : [],
  );
}

/** Of leather that is to go out: what is free, and which jobs hold the rest. */
export async function notFreeToGo(
  work: Work,
  { lotId, quantity, free }: { lotId: number; quantity: number; free: number },
) {
  const { name, say } = await describeItem(work.em, { lotId });
  const holders = await holdersOf(work.em, { lotId });
  const held = holders.length === 0 ? '' : ` Held: ${holders.join(', ')}.`;
  return wrongState(
    `Of ${name} ${say(free)} is free now, and ${say(quantity)} is to go out.${held} Change the line to what is free, or let the job go first.`,
    free > 0 ? [`send out up to ${say(free)}`] : [],
  );
}

export function requireQuantity(quantity: number): void {
  if (Number.isSafeInteger(quantity) && quantity > 0) return;
  throw invalid([{ field: 'quantity', message: 'Enter a quantity above 0.' }]);
}
