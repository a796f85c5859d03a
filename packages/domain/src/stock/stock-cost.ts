import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal, toPlaces } from '../numbers/decimal-text.ts';

export type CostMethod = 'fifo' | 'movingAverage';

/** Quantities above 0, in any unit; the unit cost 0 or more. */
export type CostedMovement = { in: DecimalText; unitCost: DecimalText } | { out: DecimalText };

export interface StockCost {
  /** of everything taken, 2 places */
  costOfGoods: DecimalText;
  /** of what is left, 2 places; where all receipts come to whole cents, it and the cost of goods come to them */
  value: DecimalText;
}

interface Layer {
  quantity: Decimal;
  cost: Decimal;
}

/**
 * What was taken from stock cost, and what the rest is worth, movement by movement (perpetual). By
 * `fifo` the oldest receipt is taken first; by `movingAverage` each receipt makes a new average of
 * all that is there. Nothing is rounded on the way, and both are rounded half up at the end; of two
 * halves of one cent the cost of goods has it, so that no cent is gained or lost.
 * @throws InvalidInput where more is taken than is there
 */
export function stockCost(movements: readonly CostedMovement[], method: CostMethod): StockCost {
  let layers: Layer[] = [];
  let [received, taken, there] = [new Exact(0), new Exact(0), new Exact(0)];
  for (const [at, movement] of movements.entries()) {
    if ('in' in movement) {
      const layer = readLayer(movement, at);
      received = received.plus(layer.cost);
      there = there.plus(layer.quantity);
      if (method === 'fifo') layers.push(layer);
      else layers = [merge([...layers, layer])];
    } else {
      const out = readQuantity(movement.out, `movements.${at}.out`);
      if (out.gt(there)) throw tooLittle({ there, out, at });
      there = there.minus(out);
      taken = taken.plus(takeFrom(layers, out));
    }
  }
  const costOfGoods = toPlaces(taken, 2);
  const left = received.eq(toPlaces(received, 2))
    ? received.minus(costOfGoods)
    : received.minus(taken);
  return { costOfGoods, value: toPlaces(left, 2) };
}

function readLayer(receipt: { in: DecimalText; unitCost: DecimalText }, at: number): Layer {
  const quantity = readQuantity(receipt.in, `movements.${at}.in`);
  const unitCost = readDecimal(receipt.unitCost, `movements.${at}.unitCost`, { min: 0 });
  return { quantity, cost: unitCost.times(quantity) };
}

const readQuantity = (text: DecimalText, field: string): Decimal =>
  readDecimal(text, field, { above: 0 });

function merge(layers: readonly Layer[]): Layer {
  return layers.reduce((all, { quantity, cost }) => ({
    quantity: all.quantity.plus(quantity),
    cost: all.cost.plus(cost),
  }));
}

function tooLittle({ there, out, at }: { there: Decimal; out: Decimal; at: number }): InvalidInput {
  return new InvalidInput(
    `movements.${at}.out`,
    `Movement ${at + 1} takes ${out.toFixed()}, and ${there.toFixed()} are there: take less, or receive first.`,
  );
}

/** Takes from the oldest layers, and says what it cost. */
function takeFrom(layers: Layer[], out: Decimal): Decimal {
  let [left, cost] = [out, new Exact(0)];
  for (let oldest = layers[0]; oldest && left.gt(0); oldest = layers[0]) {
    const whole = left.gte(oldest.quantity);
    const part = whole ? oldest.cost : oldest.cost.times(left).div(oldest.quantity);
    cost = cost.plus(part);
    const rest = { quantity: oldest.quantity.minus(left), cost: oldest.cost.minus(part) };
    left = left.minus(oldest.quantity);
    layers.splice(0, 1, ...(whole ? [] : [rest]));
  }
  return cost;
}
