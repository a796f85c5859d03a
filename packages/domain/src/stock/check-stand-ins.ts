import type { Day } from '../promise/day.ts';
import type { ItemFacts } from './check-items.ts';
import type { ItemStock, StandInStock } from './check-stock.ts';
import { drawFor, freeBy } from './promise-pool.ts';

interface RunInTurn {
  turn: number;
  startBy: Day;
  items: ItemFacts[];
}

/**
 * Offers what can stand in for hardware that is short, run by run in their turns. Only what no run asks for itself is
 * offered, and what is offered for one shortage is not offered for another. What is short stays short: whether
 * another ring will do is for people to say.
 * @param items what all runs together leave
 */
export function withStandIns<Run extends RunInTurn>(
  facts: readonly Run[],
  items: readonly ItemStock[],
): Run[] {
  const offered = [...facts];
  let left = items;
  for (const run of [...facts].sort((a, b) => a.turn - b.turn)) {
    const said = run.items.map((item) => {
      const offer = offerFor(item, left, run.startBy);
      left = offer.left;
      return { ...item, couldStandIn: offer.couldStandIn };
    });
    offered[facts.indexOf(run)] = { ...run, items: said };
  }
  return offered;
}

function offerFor({ item, short }: ItemFacts, items: readonly ItemStock[], day: Day) {
  const couldStandIn: ItemFacts['couldStandIn'] = [];
  let [left, missing] = [items, short];
  for (const standIn of item.standIns ?? []) {
    const quantity = Math.min(missing, mostOf(standIn, left, day));
    if (quantity <= 0) continue;
    couldStandIn.push({ name: standIn.name, quantity });
    left = without(left, standIn, quantity, day);
    missing -= quantity;
  }
  return { couldStandIn, left };
}

/** As many as the part allows of which there are fewest. */
function mostOf({ parts }: StandInStock, items: readonly ItemStock[], day: Day): number {
  if (parts.length === 0) return 0;
  const whole = parts.map(({ hardwareId, quantity }) => {
    const item = items.find((each) => each.hardwareId === hardwareId);
    return item === undefined ? 0 : Math.floor(freeBy(item.pool, day) / quantity);
  });
  return Math.min(...whole);
}

function without(
  items: readonly ItemStock[],
  { parts }: StandInStock,
  count: number,
  day: Day,
): readonly ItemStock[] {
  return items.map((item) => {
    const part = parts.find(({ hardwareId }) => hardwareId === item.hardwareId);
    if (part === undefined) return item;
    return { ...item, pool: drawFor(item.pool, day, part.quantity * count, day).left };
  });
}
