interface Held {
  held: number;
  /** in all, for whomever */
  onHand: number;
  /** held for jobs and not there */
  missing: number;
}

/** What a job holds of a thing; where less is there than is held, how much of it is. */
export function heldWords(
  { held, onHand, missing }: Held,
  say: (amount: number) => string,
): string {
  if (missing === 0) return `${say(held)} held`;
  if (onHand < held)
    return `${say(held)} held, ${onHand === 0 ? 'none' : `only ${say(onHand)}`} there`;
  return `${say(held)} held, only ${say(onHand)} there for all jobs`;
}
