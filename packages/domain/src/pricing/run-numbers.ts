import type { RunCost } from '../costing/cost-run.ts';
import type { DecimalText } from '../numbers/decimal-text.ts';
import type { Earnings } from './earnings.ts';

/** The numbers of one rung of the ladder. */
export interface BreakNumbers extends RunCost, Earnings {
  costLines: Earnings['costLines'];
  /** the smallest price step that keeps the rule, made never to rise with quantity */
  suggestedPrice: DecimalText;
  /** the price asked: the typed one, or else the suggested one */
  priceEach: DecimalText;
  typed: boolean;
  reachesTarget: boolean;
  /** the smallest price step with which this whole order, tooling included, reaches the target */
  priceThatReachesTarget: DecimalText;
  /** from so many pieces on, a larger quantity costs less in total; null where none does */
  cheaperFrom: number | null;
  /** that larger quantity; left out in numbers that were kept when it was always the next one */
  cheaperQuantity?: number | null;
  /** the same run again, its tooling paid for */
  reorderTotal: DecimalText;
  /** of what the customer sells a piece for, per cent that remains with them; null where unknown */
  resaleMarginPercent: DecimalText | null;
  warnings: string[];
}

/** The same run with other hardware, at every quantity. */
export interface OptionNumbers {
  name: string;
  breaks: BreakNumbers[];
}

export interface RunNumbers {
  /** in rising order of quantity */
  breaks: BreakNumbers[];
  options: OptionNumbers[];
  /** what concerns the ladder as a whole */
  warnings: string[];
}
