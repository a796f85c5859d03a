import { Decimal } from 'decimal.js';
import type { JobStep } from './job-step.entity.ts';

/** The minutes logged on a job's steps, as they travel. */
export function minutesLogged(steps: readonly JobStep[]): string {
  return steps.reduce((sum, { minutes }) => sum.plus(minutes), new Decimal(0)).toString();
}
