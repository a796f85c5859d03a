import { InvalidInput } from '../errors/domain-error.ts';
import { normalQuantile } from '../numbers/normal.ts';
import { readNumber } from '../numbers/read-number.ts';

interface Precision {
  /** how far the mean may lie from the true one, as a share of it: 0.05 for ±5 % */
  within: number;
  /** how sure that should be, above 0 and below 1 */
  confidence: number;
}

interface StudiedTimes {
  /** readings taken */
  count: number;
  mean: number;
  /** standard deviation of the readings (n − 1); null for fewer than two */
  sd: number | null;
  /** how many readings the precision asks for; null while the spread is not known */
  needed: number | null;
}

/** ±5 % at 95 %, as time studies usually ask. */
export const usualPrecision: Precision = { within: 0.05, confidence: 0.95 };

/**
 * How many readings it takes for the mean to be within ±k of the truth: n = (z s / (k x̄))², rounded
 * up, with z for the confidence from the normal distribution (Work study, International Labour
 * Office; from memory). At least 1.
 * @param times mean x̄ above 0 and standard deviation s of the readings, in one unit
 * @throws InvalidInput
 */
export function readingsNeeded(
  { mean, sd }: { mean: number; sd: number },
  { within, confidence }: Precision = usualPrecision,
): number {
  readNumber(mean, 'mean', { above: 0 });
  readNumber(sd, 'sd', { min: 0 });
  readNumber(within, 'within', { above: 0 });
  readNumber(confidence, 'confidence', { above: 0, below: 1 });
  const z = normalQuantile(0.5 + confidence / 2, 'confidence');
  // What is whole but for a last floating-point digit is not rounded up to one more.
  return Math.max(1, Math.ceil(((z * sd) / (within * mean)) ** 2 - 1e-9));
}

/**
 * Mean and spread of readings, and how many are needed.
 * @param readings each above 0, in one unit
 * @throws InvalidInput
 */
export function studyTimes(
  readings: readonly number[],
  precision: Precision = usualPrecision,
): StudiedTimes {
  if (readings.length === 0) {
    throw new InvalidInput('readings', 'Take at least one reading.');
  }
  readings.forEach((reading, at) => readNumber(reading, `readings.${at}`, { above: 0 }));
  const count = readings.length;
  const mean = readings.reduce((sum, reading) => sum + reading, 0) / count;
  if (count === 1) return { count, mean, sd: null, needed: null };
  const squares = readings.reduce((sum, reading) => sum + (reading - mean) ** 2, 0);
  const sd = Math.sqrt(squares / (count - 1));
  return { count, mean, sd, needed: readingsNeeded({ mean, sd }, precision) };
}

interface StandardTimeInput {
  /** observed mean, above 0 */
  observed: number;
  /** pace against a practised hand's, 1 where they are the same; above 0 */
  rating?: number;
  /** for rest, as a share from 0 to below 1 */
  allowance: number;
  /** what the allowance is a share of */
  of?: 'basic time' | 'working day';
}

/**
 * Standard time from what was observed: basic = observed × rating; with the allowance as a share of the
 * basic time basic × (1 + a) (International Labour Office), as a share of the working day
 * basic / (1 − a) (from memory). In the unit of `observed`.
 * @throws InvalidInput
 */
export function standardTime(input: StandardTimeInput): number {
  const { rating = 1, of = 'basic time' } = input;
  const basic =
    readNumber(input.observed, 'observed', { above: 0 }) *
    readNumber(rating, 'rating', { above: 0 });
  const allowance = readNumber(input.allowance, 'allowance', { min: 0, below: 1 });
  return of === 'basic time' ? basic * (1 + allowance) : basic / (1 - allowance);
}
