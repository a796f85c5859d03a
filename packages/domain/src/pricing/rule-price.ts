import type { Decimal } from 'decimal.js';
import { isNot, sumOf } from '../costing/cost-lines.ts';
import type { RunCost } from '../costing/cost-run.ts';
import type { PriceRule, RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact } from '../numbers/decimal-text.ts';
import { cardFeeOn, totalAt } from './charges.ts';
import { leastPrice } from './least-price.ts';
import { targetPrice, withoutExtras } from './target-price.ts';

/**
 * The smallest price step that keeps a rule, tooling aside. A margin is a share of the price, a markup
 * and a fixed sum come on top of all costs, wages and desk time included.
 * @throws NotWorkable where no price does
 */
export function rulePrice(input: RunInput, cost: RunCost, rule: PriceRule): DecimalText {
  if (rule.kind === 'target') return targetPrice(input, cost, false);
  const asked = withoutExtras(input);
  const costs = sumOf(cost.costLines, isNot('tooling'));
  return leastPrice(input.priceStep, wantedFor(rule, costs, cost.quantity), (price) => {
    const total = totalAt(asked, cost.quantity, price);
    const fee = cardFeeOn(asked, total).toDecimalPlaces(input.minorDigits);
    const wanted = wantedFor(rule, costs.plus(fee), cost.quantity);
    return total.gte(wanted.times(cost.quantity));
  });
}

/** The price each that keeps the rule with so much of costs. */
function wantedFor(rule: PriceRule, costs: Decimal, quantity: number): Decimal {
  const each = costs.div(quantity);
  if (rule.kind === 'margin') return each.div(new Exact(100).minus(rule.percent).div(100));
  if (rule.kind === 'markup') return each.times(new Exact(rule.percent).plus(100)).div(100);
  return rule.kind === 'fixed' ? each.plus(rule.amount) : each;
}
