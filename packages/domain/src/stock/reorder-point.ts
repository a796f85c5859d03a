import { normalQuantile } from '../numbers/normal.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface DemandOverLead {
  /** demand per period, mean and standard deviation */
  demandMean: number;
  demandSd: number;
  /** periods until a delivery comes, mean and standard deviation */
  leadMean: number;
  leadSd: number;
}

/** `service`: the chance that stock lasts until the delivery, between 0 and 1; or its normal quantile z. */
export type Service = { service: number } | { z: number };

export interface ReorderPoint {
  safety: number;
  /** order when so much is left */
  point: number;
}

/**
 * When to order: mean demand until the delivery plus safety stock,
 * z √(leadMean × demandSd² + demandMean² × leadSd²), demand of the periods taken as independent and
 * normal (textbook formula, such as Heizer and Render's, from memory). A service below one half
 * gives a safety stock below 0, and so does a z below 0, which is the same.
 * @throws InvalidInput
 */
export function reorderPoint(input: DemandOverLead & Service): ReorderPoint {
  const demand = readNumber(input.demandMean, 'demandMean', { min: 0 });
  const demandSd = readNumber(input.demandSd, 'demandSd', { min: 0 });
  const lead = readNumber(input.leadMean, 'leadMean', { min: 0 });
  const leadSd = readNumber(input.leadSd, 'leadSd', { min: 0 });
  const z = 'z' in input ? readNumber(input.z, 'z') : normalQuantile(input.service, 'service');
  const safety = z * Math.hypot(Math.sqrt(lead) * demandSd, demand * leadSd);
  return { safety, point: demand * lead + safety };
}
