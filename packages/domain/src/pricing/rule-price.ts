import type { Decimal } from 'decimal.js';
import { sumOf } from '../costing/cost-lines.ts';
import type { RunCost } from '../costing/cost-run.ts';
import type { PriceRule, RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact } from '../numbers/decimal-text.ts';
import { earn } from './earnings.ts';
import { leastPrice } from './least-price.ts';
import { targetPrice, withoutExtras, withoutTooling } from './target-price.ts';

/**
 * The smallest price step that keeps a rule, tooling aside. A margin is a share of the price, a markup
 * and a fixed sum come on top of all costs, wages and desk time included.
 * @throws NotWorkable where no price does
 */
export function rulePrice(input: RunInput, cost: RunCost, rule: PriceRule): DecimalText {
  if (rule.kind === 'target') return targetPrice(input, cost, false);
  const [asked, order] = [withoutExtras(input), withoutTooling(cost)];
  const costs = sumOf(order.costLines, () => true);
  return leastPrice(input.priceStep, wantedFor(rule, costs, cost.quantity), (price) => {
    const earned = earn(asked, order, price);
    const allCosts = sumOf(earned.costLines, () => true);
    return new Exact(earned.total).gte(
      wantedFor(rule, allCosts, cost.quantity).times(cost.quantity),
    );
  });
}

/** The price each that keeps the rule with so much of costs. */
function wantedFor(rule: PriceRule, costs: Decimal, quantity: number): Decimal {
  const each = costs.div(quantity);
  if (rule.kind === 'margin') return each.div(new Exact(100).minus(rule.percent).div(100));
  if (rule.kind === 'markup') return each.times(new Exact(rule.percent).plus(100)).div(100);
  return rule.kind === 'fixed' ? each.plus(rule.amount) : each;
}
