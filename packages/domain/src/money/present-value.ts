import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal, toPlaces } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

/**
 * What flows of money are worth today: Σ flow(t) / (1 + rate)^t, t = 0, 1, 2 … in years, the first
 * flow being today's; rounded half up once to 2 places. Money spent is below zero.
 * @param rate a year's discount, a share from 0 to 1
 * @throws InvalidInput
 */
export function presentValue(rate: number, flows: readonly DecimalText[]): DecimalText {
  const growth = new Exact(readNumber(rate, 'rate', { min: 0, max: 1 })).plus(1);
  if (flows.length === 0) throw new InvalidInput('flows', 'Give at least one flow of money.');
  const read = flows.map((flow, at) => readDecimal(flow, `flows.${at}`));
  // From the last to the first (Horner), so that nothing is raised to a high power.
  const value = read.reduceRight((later, flow) => later.div(growth).plus(flow), new Exact(0));
  return toPlaces(value, 2);
}
