import { type DecimalText, readDecimal, readWhole, toPlaces } from '../numbers/decimal-text.ts';

interface Asset {
  /** what it cost, in major units; 0 or more */
  price: DecimalText;
  /** what it will still be worth at the end, not above its price */
  salvage: DecimalText;
  /** how long it is used, whole years from 1 to 100 */
  years: number;
}

/**
 * What something loses of its worth each year where it loses the same every year: (price − salvage) / years, to the
 * cent, half up. What may be written off is for the local authority and an accountant to say.
 * @throws InvalidInput
 */
export function straightLine({ price, salvage, years }: Asset): DecimalText {
  const paid = readDecimal(price, 'price', { min: 0 });
  const left = readDecimal(salvage, 'salvage', { min: 0, max: paid.toNumber() });
  return toPlaces(paid.minus(left).div(readWhole(years, 'years', 1, 100)), 2);
}
