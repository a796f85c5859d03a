import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { round } from '../money/round.ts';

interface MadeRun {
  /** leather and hardware that the run took, in whole hundredths, 0 or more */
  cost: number;
  /** pieces that came out, good and seconds together */
  made: number;
  /** of them, good ones beyond what is ordered, and seconds */
  overs: number;
  seconds: number;
}

/**
 * What the pieces of a run that stay in the shop cost, in whole hundredths: of the leather and hardware that the run
 * took, the same share for every piece that came out, good or not. Wages are left out: they were spent on the order.
 * Rounded half up once for both together, so that the two never sum to a cent more or less than their share.
 * @throws {InvalidInput} where more would stay than came out
 */
export function costOfKept({ cost, made, overs, seconds }: MadeRun): {
  overs: number;
  seconds: number;
} {
  if (overs < 0 || seconds < 0 || overs + seconds > made)
    throw new InvalidInput('made', 'No more can stay than came out.');
  const upTo = (pieces: number) =>
    made === 0 ? 0 : round(new Exact(cost).times(pieces).dividedBy(made), 0).toNumber();
  return { overs: upTo(overs), seconds: upTo(overs + seconds) - upTo(overs) };
}
