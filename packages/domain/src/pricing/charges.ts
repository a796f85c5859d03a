import type { Decimal } from 'decimal.js';
import type { RunInput } from '../costing/run-input.ts';
import { lineAmount } from '../money/amounts.ts';
import { type DecimalText, Exact, toPlaces } from '../numbers/decimal-text.ts';

type ChargeKind = 'set-up' | 'rush' | 'minimum' | 'carriage';

/** What the customer pays once, beside the pieces and the tooling. */
export interface Charge {
  kind: ChargeKind;
  name: string;
  amount: DecimalText;
}

/** What an order comes to. */
export interface Billed {
  goodsTotal: DecimalText;
  toolingCharge: DecimalText;
  charges: Charge[];
  total: DecimalText;
}

/**
 * The pieces at their price, tooling and charges as lines of their own. Rush is a share of the goods;
 * an order below the minimum is brought up to it, tooling and carriage aside.
 */
export function bill(input: RunInput, quantity: number, priceEach: DecimalText): Billed {
  const digits = input.minorDigits;
  const goodsTotal = lineAmount(quantity, priceEach, digits);
  return {
    goodsTotal,
    toolingCharge: toolingCharge(input),
    charges: chargesOn(input, new Exact(goodsTotal))
      .filter(([, , amount]) => !amount.isZero())
      .map(([kind, name, amount]) => ({ kind, name, amount: toPlaces(amount, digits) })),
    total: toPlaces(totalAt(input, quantity, new Exact(priceEach)), digits),
  };
}

/** What an order comes to, without its lines: for a search that asks many prices. */
export function totalAt(input: RunInput, quantity: number, priceEach: Decimal): Decimal {
  const goods = priceEach.times(quantity).toDecimalPlaces(input.minorDigits);
  return chargesOn(input, goods).reduce(
    (sum, [, , amount]) => sum.plus(amount),
    goods.plus(toolingCharge(input)),
  );
}

/** What the card company keeps of a total, not yet rounded. */
export function cardFeeOn({ cardFee }: RunInput, total: Decimal): Decimal {
  return cardFee ? total.times(cardFee.percent).div(100).plus(cardFee.each) : new Exact(0);
}

function chargesOn(input: RunInput, goods: Decimal): [ChargeKind, string, Decimal][] {
  const digits = input.minorDigits;
  const setUp = new Exact(input.setUpCharge ?? '0');
  const rush = goods
    .times(input.rushPercent ?? '0')
    .div(100)
    .toDecimalPlaces(digits);
  const missing = new Exact(input.minimumOrder ?? '0').minus(goods).minus(setUp).minus(rush);
  return [
    ['set-up', 'Setting up', setUp],
    ['rush', 'Rush', rush],
    ['minimum', 'Up to the minimum order', Exact.max(0, missing)],
    ['carriage', 'Carriage', new Exact(input.carriage?.charge ?? '0')],
  ];
}

/** What the customer pays for tooling, once. */
function toolingCharge(input: RunInput): DecimalText {
  const sum = input.tooling.reduce((total, { charge }) => total.plus(charge), new Exact(0));
  return sum.toFixed(input.minorDigits);
}
