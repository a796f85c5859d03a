import { InvalidInput } from '../errors/domain-error.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface ProductionLot {
  /** units a year */
  demand: number;
  /** of beginning one lot */
  setupCost: number;
  /** of keeping one unit for a year */
  holdingCost: number;
  /** units used a day */
  used: number;
  /** units made a day, more than are used */
  made: number;
}

/**
 * How many to make at a time where they come in over days while some are used:
 * √(2 × demand × set-up cost / (holding cost × (1 − used / made))) (Taft 1918, from memory).
 * @throws InvalidInput
 */
export function productionLot({ demand, setupCost, holdingCost, used, made }: ProductionLot) {
  const inputs = { demand, setupCost, holdingCost, used, made };
  for (const [field, value] of Object.entries(inputs)) readNumber(value, field, { above: 0 });
  if (made <= used) {
    throw new InvalidInput('made', 'More must be made a day than is used: check the two.');
  }
  return Math.sqrt((2 * demand * setupCost) / (holdingCost * (1 - used / made)));
}
