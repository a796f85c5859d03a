import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal } from '../numbers/decimal-text.ts';

/**
 * After how many years the money spent has come back: the first moment at which the flows so far
 * sum to 0 or more, a year's flow counted as coming in evenly over that year. The first flow is
 * today's and is spent (below 0); null where the money does not come back within the flows given.
 * Nothing is discounted.
 * @throws InvalidInput
 */
export function paybackYears(flows: readonly DecimalText[]): number | null {
  const [first = new Exact(0), ...later] = flows.map((flow, at) =>
    readDecimal(flow, `flows.${at}`),
  );
  if (!first.lt(0)) {
    throw new InvalidInput('flows.0', 'Begin with the money spent today, below 0, such as -1200.');
  }
  let open = first;
  for (const [at, flow] of later.entries()) {
    const after = open.plus(flow);
    if (after.gte(0)) return open.neg().div(flow).plus(at).toNumber();
    open = after;
  }
  return null;
}
