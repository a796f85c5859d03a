import type { JobHardware } from '@hidewright/contract';

/** What a job holds of a thing; where a count found less than is held, how much of it is there. */
export function heldWords(
  { held, onHand, missing }: Pick<JobHardware, 'held' | 'onHand' | 'missing'>,
  say: (count: number) => string,
): string {
  if (missing === 0) return `${say(held)} held`;
  if (onHand < held)
    return `${say(held)} held, ${onHand === 0 ? 'none' : `only ${say(onHand)}`} there`;
  return `${say(held)} held, only ${say(onHand)} there for all jobs`;
}
