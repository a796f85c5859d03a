import { checkRunInput } from './check-run-input.ts';
import { costRun, type RunCost } from './cost-run.ts';
import type { RunInput } from './run-input.ts';

/**
 * What so many pieces of a run take and cost: cut count, leather, hardware, minutes, before any price is looked for.
 * @param quantity 1 or more
 * @throws {InvalidInput | NotWorkable}
 */
export function runNeeds(input: RunInput, quantity: number): RunCost {
  checkRunInput({ ...input, breaks: [{ quantity, typedPrice: null }] });
  return costRun(input, quantity);
}
