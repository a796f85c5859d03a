import { readNumber } from '../numbers/read-number.ts';
import { addDays, type Day } from '../promise/day.ts';
import { addWorkdays, isWorkday } from '../promise/workdays.ts';
import { meanAndSpread } from './spread.ts';

export interface LeadTime {
  /** days until a delivery comes, mean and standard deviation */
  meanDays: number;
  sdDays: number;
  /** how many deliveries that is taken from; 0 where it is what the supplier says */
  deliveries: number;
}

/** Fewer deliveries say nothing of a spread. */
const fewestDeliveries = 3;

/**
 * How long a supplier takes: as their deliveries took, from three on; before that as they say, with
 * no spread.
 * @param said days, 0 or more
 * @param took days from sending an order to its first delivery, one for each order; 0 or more
 * @throws InvalidInput
 */
export function leadTime(said: number, took: readonly number[]): LeadTime {
  readNumber(said, 'said', { min: 0 });
  took.forEach((days, at) => readNumber(days, `took.${at}`, { min: 0 }));
  if (took.length < fewestDeliveries) return { meanDays: said, sdDays: 0, deliveries: 0 };
  const { mean, sd } = meanAndSpread(took);
  return { meanDays: mean, sdDays: sd, deliveries: took.length };
}

/**
 * The day on which something comes that is ordered today: a delivery comes on a working day.
 * @throws InvalidInput when today is no day
 */
export function arrivalDay(today: Day, { meanDays }: Pick<LeadTime, 'meanDays'>): Day {
  const day = addDays(today, Math.round(meanDays));
  return isWorkday(day) ? day : addWorkdays(day, 1);
}
