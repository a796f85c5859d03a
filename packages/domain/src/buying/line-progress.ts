export interface LineProgress {
  /** still awaited, 0 where nothing more will come */
  toCome: number;
  /** came beyond what was ordered */
  over: number;
  /** ordered and never to come */
  short: number;
}

/**
 * How far a line of an order to a supplier has come. Quantities are whole numbers in the line's own
 * unit (pieces, or thousandths of mm²), 0 or more. While the order is `awaited` the rest is to come;
 * once it is closed, the rest is short.
 */
export function lineProgress(
  { ordered, received }: { ordered: number; received: number },
  awaited: boolean,
): LineProgress {
  const missing = Math.max(0, ordered - received);
  return {
    toCome: awaited ? missing : 0,
    over: Math.max(0, received - ordered),
    short: awaited ? 0 : missing,
  };
}
