interface CountedLine {
  /** what was there when it was counted, 0 or more, in the ledger's unit */
  counted: number;
  /** what the books said at that moment */
  bookThen: number;
  /** what they say now: less or more by what moved since */
  onHandNow: number;
  /** what is held for jobs now */
  reserved: number;
}

export interface CountOutcome {
  /** what the count adds to the books, or takes from them */
  difference: number;
  /** on hand once it is posted; below 0 where more was taken since than was there */
  after: number;
  /** how much of what is held would then not be there */
  missing: number;
}

/**
 * What a count changes. What moved between counting and posting is in the books already and stays: the difference is
 * against the books at the moment of counting, not at the moment of posting. All in whole units of the ledger.
 */
export function countOutcome({
  counted,
  bookThen,
  onHandNow,
  reserved,
}: CountedLine): CountOutcome {
  const difference = counted - bookThen;
  const after = onHandNow + difference;
  return { difference, after, missing: Math.max(0, reserved - Math.max(0, after)) };
}
