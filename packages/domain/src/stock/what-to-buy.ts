import { type DecimalText, Exact, toAtMost } from '../numbers/decimal-text.ts';
import type { LeatherStock } from './check-stock.ts';

export interface LeatherToBuy {
  /** as it is bought, waste and all */
  areaMm2: DecimalText;
  /** whole sides or hides, where it is known what it is bought as */
  whole: { count: number; form: string } | null;
}

/**
 * What to buy so that an area can be cut: its usable share is less than all of it, and it comes in whole sides or
 * hides where the shop said so.
 * @param usable thousandths of mm² to cut
 */
export function leatherToBuy(
  { whole, usablePercent }: Pick<LeatherStock, 'whole' | 'usablePercent'>,
  usable: number,
): LeatherToBuy {
  const gross = new Exact(usable).div(1000).times(100).div(usablePercent);
  if (whole === null) {
    return { areaMm2: toAtMost(gross.toDecimalPlaces(3, Exact.ROUND_UP), 3), whole: null };
  }
  // The 20th place keeps a division's last digit from costing a side.
  const count = gross.div(whole.areaMm2).toDecimalPlaces(20).ceil().toNumber();
  return {
    areaMm2: toAtMost(new Exact(whole.areaMm2).times(count), 3),
    whole: { count, form: whole.form },
  };
}

/** Pieces to buy, in full packs. */
export function packsToBuy(packSize: number, pieces: number): { packs: number; pieces: number } {
  const packs = Math.ceil(pieces / packSize);
  return { packs, pieces: packs * packSize };
}
