import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, readDecimal, toPlaces } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';
import { type CheckedBreak, checkPriceBreaks, type PriceBreak } from '../pricing/price-breaks.ts';

interface Ordering {
  /** units a year, above 0 */
  demand: number;
  /** of placing one order, above 0 */
  orderCost: DecimalText;
}

/** Keeping one unit for a year costs so much, whatever its price; above 0. */
export interface FixedHolding extends Ordering {
  holdingCost: DecimalText;
  breaks?: readonly PriceBreak[];
}

/** Keeping a unit for a year costs this share of its price; above 0. */
export interface HoldingByPrice extends Ordering {
  holdingRate: number;
  breaks: readonly PriceBreak[];
}

export interface OrderQuantity {
  /** unrounded, but at a break or just below one a whole number */
  quantity: number;
  /** ordering and holding, and the goods themselves where prices are given; 2 places */
  annualCost: DecimalText;
}

interface Costs {
  demand: Decimal;
  orderCost: Decimal;
  holdingOf: (price: Decimal) => Decimal;
}

/**
 * How much to order at a time so that a year costs least: √(2 × demand × order cost / holding cost)
 * (Harris, Factory 10, 1913). With price breaks, which hold for the whole order, the same at each
 * price, moved into the quantities at which that price holds (up to a unit below the next break);
 * the cheapest year wins, at a tie the smaller quantity.
 * @throws InvalidInput
 */
export function orderQuantity(input: FixedHolding | HoldingByPrice): OrderQuantity {
  const costs = readCosts(input);
  if (!input.breaks) return answer(costs, best(costs, new Exact(0)), new Exact(0));
  const ladder = checkPriceBreaks(input.breaks, 0);
  const choices = ladder.flatMap((here, at) => {
    const quantity = within(best(costs, here.price), here, ladder[at + 1]);
    return { quantity, price: here.price, cost: yearlyCost(costs, quantity, here.price) };
  });
  const { quantity, price } = choices.reduce((a, b) => (b.cost.lt(a.cost) ? b : a));
  return answer(costs, quantity, price);
}

function readCosts(input: FixedHolding | HoldingByPrice): Costs {
  const demand = new Exact(readNumber(input.demand, 'demand', { above: 0 }));
  const orderCost = readCost(input.orderCost, 'orderCost');
  if ('holdingCost' in input) {
    const fixed = readCost(input.holdingCost, 'holdingCost');
    return { demand, orderCost, holdingOf: () => fixed };
  }
  const rate = readNumber(input.holdingRate, 'holdingRate', { above: 0 });
  return { demand, orderCost, holdingOf: (price) => price.times(rate) };
}

const readCost = (text: DecimalText, field: string): Decimal =>
  readDecimal(text, field, { above: 0, max: '1000000000000' });

const best = ({ demand, orderCost, holdingOf }: Costs, price: Decimal): Decimal =>
  demand.times(orderCost).times(2).div(holdingOf(price)).sqrt();

function within(quantity: Decimal, here: CheckedBreak, next: CheckedBreak | undefined): Decimal {
  const most = next && quantity.gte(next.from) ? new Exact(next.from - 1) : quantity;
  return Exact.max(here.from, most);
}

function yearlyCost({ demand, orderCost, holdingOf }: Costs, quantity: Decimal, price: Decimal) {
  const ordering = demand.times(orderCost).div(quantity);
  return ordering.plus(holdingOf(price).times(quantity).div(2)).plus(demand.times(price));
}

const answer = (costs: Costs, quantity: Decimal, price: Decimal): OrderQuantity => ({
  quantity: quantity.toNumber(),
  annualCost: toPlaces(yearlyCost(costs, quantity, price), 2),
});
