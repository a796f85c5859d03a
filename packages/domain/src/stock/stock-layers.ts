import { Exact } from '../numbers/decimal-text.ts';
import { round } from '../money/round.ts';

/** Stock that came in together, or what is left of it. */
export interface StockLayer {
  /** whole units, above 0 */
  quantity: number;
  /** what all of it cost, in whole hundredths */
  value: number;
}

/** A movement as the ledger keeps it: signed, what it is worth as well. */
export interface ValuedMovement {
  quantity: number;
  value: number;
  /** it takes back what came in last, such as a receipt that is written again at another cost */
  undoes?: boolean;
}

/**
 * What is left of each receipt after movements in their order, the oldest first: what goes is taken from the oldest.
 * Each part is rounded to the hundredth half up and the rest of a layer is what remains of it, so that the layers and
 * what was taken from them always sum to what came in. Perpetual first in, first out; a count that finds more is a
 * layer of its own. What undoes a receipt takes it out of the newest, at what it came in for: nothing older is gone.
 */
export function stockLayers(movements: readonly ValuedMovement[]): StockLayer[] {
  const layers: StockLayer[] = [];
  for (const { quantity, value, undoes } of movements) {
    if (quantity > 0) layers.push({ quantity, value });
    else if (undoes) undoNewest(layers, { quantity: -quantity, value: -value });
    else takeOldest(layers, -quantity);
  }
  return layers;
}

/**
 * What a quantity costs when the oldest is taken first, in whole hundredths.
 * @param quantity whole units, at most what the layers hold; what is beyond costs nothing here
 */
export function costOfOldest(layers: readonly StockLayer[], quantity: number): number {
  return takeOldest([...layers], quantity);
}

/** Takes from the oldest layers, and says what it cost. */
function takeOldest(layers: StockLayer[], quantity: number): number {
  let [left, cost] = [quantity, 0];
  for (let oldest = layers[0]; oldest && left > 0; oldest = layers[0]) {
    const part = left >= oldest.quantity ? oldest.value : shareOf(oldest, left);
    cost += part;
    if (left >= oldest.quantity) layers.shift();
    else layers[0] = { quantity: oldest.quantity - left, value: oldest.value - part };
    left -= oldest.quantity;
  }
  return cost;
}

/** A receipt of before the layers began lies in one with all that was there then, and leaves the rest of it. */
function undoNewest(layers: StockLayer[], undone: StockLayer): void {
  let { quantity, value } = undone;
  for (let newest = layers.pop(); newest; newest = layers.pop()) {
    if (quantity < newest.quantity) {
      layers.push({ quantity: newest.quantity - quantity, value: newest.value - value });
      return;
    }
    quantity -= newest.quantity;
    value -= newest.value;
    if (quantity === 0) return;
  }
}

const shareOf = ({ quantity, value }: StockLayer, part: number): number =>
  round(new Exact(value).times(part).dividedBy(quantity), 0).toNumber();
