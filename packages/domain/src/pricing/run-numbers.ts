import type { RunCost } from '../costing/cost-run.ts';
import type { DecimalText } from '../numbers/decimal-text.ts';

/** The numbers of one rung of the ladder. */
export interface BreakNumbers extends RunCost {
  /** the smallest price step that reaches the target, made never to rise with quantity */
  suggestedPrice: DecimalText;
  /** the price asked: the typed one, or else the suggested one */
  priceEach: DecimalText;
  typed: boolean;
  goodsTotal: DecimalText;
  toolingCharge: DecimalText;
  total: DecimalText;
  /** of the total, after all costs, wages and desk time included; one place */
  marginPercent: DecimalText;
  /** of the total, after everything bought: leather, hardware, tooling, packing */
  left: DecimalText;
  /** left, before wages, by bench hours */
  perBenchHour: DecimalText;
  /** left after all wages, by all hours, desk time included */
  perHourAllIn: DecimalText;
  reachesTarget: boolean;
  /** the run does not even earn its costs, wages included */
  loses: boolean;
  /** the smallest price step with which this whole order, tooling included, reaches the target */
  priceThatReachesTarget: DecimalText;
  /** from so many pieces on, the next larger quantity costs less in total; null where none does */
  cheaperFrom: number | null;
  warnings: string[];
}

export interface RunNumbers {
  /** in rising order of quantity */
  breaks: BreakNumbers[];
  /** what concerns the ladder as a whole */
  warnings: string[];
}
