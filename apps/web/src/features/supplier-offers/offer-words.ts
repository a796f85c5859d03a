import type { SupplierOfferReply } from '@hidewright/contract';
import { isPriceKnown, type OfferedBuy } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { areaText, countText, moneyText } from '../../lib/formatting.ts';
import { areaExamples, areaUnits, readArea } from '../../lib/units.ts';
import type { Workshop } from '../../lib/workshop.tsx';

type Unit = SupplierOfferReply['unit'];

/** A quantity of an offer as people say it: 250, or 24.75 ft². */
export function quantityText(quantity: string, unit: Unit, { areaUnit }: Workshop): string {
  return unit === 'mm2' ? areaText(quantity, areaUnit) : countText(Number(quantity));
}

/** What is wrong with a needed quantity that cannot be reckoned with. */
export function neededFault(text: string, unit: Unit, areaUnit: Workshop['areaUnit']): string {
  if (unit === 'mm2') {
    return readArea(text, areaUnit) === undefined
      ? `Enter the area in ${areaUnits[areaUnit].sign}, such as ${areaExamples[areaUnit]}.`
      : 'Enter how much is needed, above 0.';
  }
  const typed = text.trim();
  if (!/^\d+$/.test(typed)) return 'Enter how many are needed, as a whole number.';
  return Number(typed) === 0
    ? 'Enter how many are needed, above 0.'
    : 'That is too many: enter at most 99,999,999.';
}

/** What is sold: from 100, in packs of 50. */
export function soldText(offer: SupplierOfferReply, workshop: Workshop): string {
  const { minimum, multiple, unit } = offer;
  const say = (quantity: string) => quantityText(quantity, unit, workshop);
  return [
    minimum === null ? '' : `at least ${say(minimum)}`,
    multiple === null ? '' : `in packs of ${say(multiple)}`,
  ]
    .filter(Boolean)
    .join(', ');
}

/** Whether it is known what the supplier asks; the maker is not told. */
export function hasPrice({ breaks: [first] = [] }: Pick<SupplierOfferReply, 'breaks'>): boolean {
  return first !== undefined && isPriceKnown(first.price);
}

/** Who is not among those that are compared, and what to do about it. */
export function leftOutText(offers: readonly SupplierOfferReply[]): string {
  const names = offers.filter((offer) => !hasPrice(offer)).map(({ supplierName }) => supplierName);
  if (names.length === 0) return '';
  return `Without ${names.join(' and ')}: ask what it costs there, and enter it.`;
}

/** 36 more pieces cost 1.20 less; nothing where buying more than is needed does not pay. */
export function buyMoreText({ plain, next, best }: OfferedBuy, unit: Unit, workshop: Workshop) {
  const say = (quantity: string) => quantityText(quantity, unit, workshop);
  const more = (quantity: string) => {
    const beyond = new Decimal(quantity).minus(plain.quantity).toFixed();
    return unit === 'mm2' ? `${say(beyond)} more` : `${say(beyond)} more pieces`;
  };
  if (best.quantity !== plain.quantity) {
    const saved = moneyText(new Decimal(plain.cost).minus(best.cost).toFixed(2));
    return `${more(best.quantity)} cost ${saved} less: take ${say(best.quantity)} for ${moneyText(best.cost)}.`;
  }
  if (next === null || next.worth === 'no') return '';
  const extra = next.dearerBy === '0.00' ? 'nothing' : `only ${moneyText(next.dearerBy)}`;
  return `${more(next.quantity)} cost ${extra} more: ${say(next.quantity)} for ${moneyText(next.cost)}.`;
}
