import type { DecimalText } from '../numbers/decimal-text.ts';

/** How heavy leather is, in ounces (1 oz is 1/64 in thick); null where nobody said. */
export interface LeatherWeight {
  weightLowOz: DecimalText | null;
  weightHighOz: DecimalText | null;
  /** tags of the lots whose own weight it is; none where it is the range that their leather is sold by */
  lots?: readonly string[];
}

/** A lot, or lots that are alike, by the weight that was measured. */
export const weightOfLots = (weightOz: DecimalText, lots: readonly string[]): LeatherWeight => ({
  weightLowOz: weightOz,
  weightHighOz: weightOz,
  lots,
});
