export * from './errors/domain-error.ts';
export {
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
  upToWhole,
  toPlaces,
  toText,
} from './numbers/decimal-text.ts';
export type { DecimalText, Limits } from './numbers/decimal-text.ts';
export { countWords, figureWords } from './numbers/count-words.ts';
export { normalLoss, normalQuantile } from './numbers/normal.ts';

export * from './units/measures.ts';
export * from './units/convert.ts';
export * from './units/mixed-number.ts';
export * from './units/footage.ts';
export * from './units/rack-footage.ts';
export * from './units/area-price.ts';
export * from './units/length.ts';

export * from './money/round.ts';
export * from './money/allocate.ts';
export * from './money/currencies.ts';
export * from './money/amounts.ts';
export * from './money/invoice-totals.ts';
export * from './money/present-value.ts';
export * from './money/payback.ts';
export * from './money/straight-line.ts';
export * from './money/creditor-reference.ts';

export * from './outline/outline.ts';
export { checkOutline } from './outline/check-outline.ts';
export { cuttingEdgeMm, outlineArea, outlineBounds } from './outline/measure.ts';
export { outlinePolygon } from './outline/polygon.ts';
export { outlinePath } from './outline/outline-path.ts';
export { describeOutline } from './outline/describe-outline.ts';
export type * from './outline/drawing.ts';
export { readDrawing } from './outline/read-drawing.ts';
export { safeLine } from './outline/safe-line.ts';
export { templateSvg } from './outline/template.ts';
export { holesWithin, outlineFromDrawing } from './outline/outline-from-drawing.ts';

export type * from './yield/layout.ts';
export { layOut, layOutSide } from './yield/lay-out.ts';
export { adviseCut, adviseLots } from './yield/advise.ts';
export type { CutAdvice, CutSource, RackLot } from './yield/advise.ts';
export { largestOffcut } from './yield/offcut.ts';
export { placedRing } from './yield/placed-ring.ts';
export { stripCuts } from './yield/strip-cuts.ts';
export type { StripCuts } from './yield/strip-cuts.ts';
export type { Watch } from './yield/lie.ts';
export { handCount } from './yield/hand-count.ts';
export { layoutInputKey } from './yield/layout-input-key.ts';

export * from './leather/drawn-side.ts';
export * from './leather/leather-weight.ts';

export * from './press/press-load.ts';

export type * from './nest/problem.ts';
export { planRegular } from './nest/plan-regular.ts';
export { findBest } from './nest/find-best.ts';
export type { BestSearch } from './nest/find-best.ts';
export { nestBounds, nestWastes } from './nest/bounds.ts';
export type { NestBounds, NestWastes } from './nest/bounds.ts';
export { nestFaults } from './nest/nest-faults.ts';
export { readNestCase } from './nest/case-file.ts';
export { nestAnswer } from './nest/answer-nest.ts';
export { packRectangles } from './nest/rectangles.ts';
export type * from './nest/rectangles.ts';

export * from './rejects/cut-count.ts';
export * from './rejects/allowance.ts';
export * from './rejects/interval.ts';
export { chanceOfEnough } from './rejects/chance.ts';

export * from './work/work-plan.ts';
export * from './work/bench-minutes.ts';
export { withMinutes } from './work/with-minutes.ts';
export { withRejects } from './work/with-rejects.ts';
export * from './work/flow-time.ts';
export * from './work/ways-of-working.ts';
export * from './work/learning.ts';
export * from './work/time-study.ts';

export * from './tooling/plate-advice.ts';
export * from './tooling/plate-choice.ts';

export * from './costing/run-input.ts';
export { hardwareOrdered, lossesUnsaid, unitsFor } from './costing/hardware-counts.ts';
export { hourlyKinds } from './costing/cost-lines.ts';
export type { CostKind, CostLine } from './costing/cost-lines.ts';
export type { RunCost } from './costing/cost-run.ts';
export * from './costing/run-needs.ts';
export type { Charge } from './pricing/charges.ts';
export type * from './pricing/run-numbers.ts';
export { priceRun } from './pricing/price-run.ts';
export { quantityThatReaches } from './pricing/quantity-that-reaches.ts';
export { shakeRun } from './pricing/sensitivity.ts';
export type { Shake } from './pricing/sensitivity.ts';
export { priceInversions, priceRises } from './pricing/price-breaks.ts';
export type { PriceBreak, PriceInversion } from './pricing/price-breaks.ts';

export * from './stock/check-runs.ts';
export type * from './stock/check-stock.ts';
export type { ItemFacts, Standing } from './stock/check-items.ts';
export type { LeatherFacts, LotTaken } from './stock/check-leather.ts';
export { weightsCut } from './stock/weights-cut.ts';
export type { ToolFacts } from './stock/check-tools.ts';
export * from './stock/check-words.ts';
export * from './stock/coming-weeks.ts';
export * from './stock/coming-stock.ts';
export * from './stock/what-to-buy.ts';
export * from './stock/wholes.ts';
export { usableOf } from './stock/pieces-from-lot.ts';
export type { CutFrom } from './stock/pieces-from-lot.ts';
export type { Dated, PromisePool } from './stock/promise-pool.ts';
export * from './stock/order-quantity.ts';
export * from './stock/production-lot.ts';
export * from './stock/reorder-point.ts';
export * from './stock/finished-cost.ts';
export * from './stock/forecast.ts';
export * from './stock/item-use.ts';
export * from './stock/lead-time.ts';
export * from './stock/order-suggestion.ts';
export * from './stock/count-outcome.ts';
export * from './stock/label-grid.ts';
export * from './stock/mixed-lots.ts';
export * from './stock/offcut-area.ts';
export * from './stock/scanned-tag.ts';
export * from './stock/stock-cost.ts';
export * from './stock/stock-layers.ts';
export * from './stock/available-to-promise.ts';
export * from './stock/supplier-offer.ts';
export * from './stock/best-buy.ts';
export * from './stock/ordered-quantity.ts';

export * from './hardware/kit-prices.ts';
export * from './hardware/kit-words.ts';
export * from './hardware/count-by-weight.ts';
export * from './hardware/units.ts';
export * from './hardware/post-fit.ts';

export * from './buying/share-carriage.ts';
export * from './buying/share-service.ts';
export * from './buying/compare-area.ts';
export * from './buying/line-progress.ts';

export * from './promise/day.ts';
export * from './promise/workdays.ts';
export type { Bench, WorkPart } from './promise/bench-time.ts';
export { partsOf } from './promise/held-work.ts';
export type { HeldWork } from './promise/held-work.ts';
export { doneOn } from './promise/elapsed-days.ts';
export { planDays } from './promise/plan-days.ts';
export type { PlannedDay } from './promise/plan-days.ts';
export * from './promise/bench-plan.ts';
export { movedPromise } from './promise/moved-promise.ts';
export type { MovedPromise } from './promise/moved-promise.ts';
export * from './promise/late-jobs.ts';
export * from './promise/two-machine.ts';

export * from './plan/machine-pays.ts';
export * from './plan/linear-programme.ts';
export type * from './plan/week.ts';
export { readWeek } from './plan/read-week.ts';
export { weekMix } from './plan/week-mix.ts';

export * from './compare/compare-run.ts';
export * from './compare/bought-variances.ts';
export * from './compare/time-variances.ts';
export * from './learn/match-steps.ts';
export * from './learn/pool-leather.ts';
export * from './learn/pool-losses.ts';
export * from './learn/pool-minutes.ts';
export * from './learn/pool-shares.ts';
export * from './learn/pool-step-time.ts';
export * from './learn/unusual-runs.ts';
export { compute, computeNames } from './compute/compute.ts';
