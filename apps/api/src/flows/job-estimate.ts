import { priceRun, type BreakNumbers, type RunInput } from '@hidewright/domain';
import type { Job } from '../modules/jobs/job.entity.ts';

/** What the quote said of the run, kept with its job so that fact can stand beside it. */
export interface JobEstimate {
  /** The run as it was priced, with the one quantity that was agreed. */
  input: RunInput;
  leatherId: number;
  leatherAreaMm2: string;
  hardware: { hardwareId: number; quantity: number }[];
}

export const estimateOf = (job: Job): JobEstimate => job.estimate as JobEstimate;

/** The numbers of the run as they were said. */
export function numbersOf({ input }: JobEstimate): BreakNumbers {
  const [numbers] = priceRun(input).breaks;
  if (numbers === undefined) throw new TypeError('A job is of one quantity');
  return numbers;
}
