import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal } from '../numbers/decimal-text.ts';

/** A price for one unit of the whole order, once the order comes to `from`. */
export interface OfferBreak {
  /** in the unit that is counted, 0 or more */
  from: DecimalText;
  /** of one priced unit, up to 4 places */
  price: DecimalText;
}

/** At which quantities and prices a supplier sells a thing. */
export interface OfferTerms {
  /** the least that is sold, in the unit that is counted; null where there is no least */
  minimum: DecimalText | null;
  /** only multiples of this are sold, a pack; null where any quantity is */
  multiple: DecimalText | null;
  breaks: readonly OfferBreak[];
}

/**
 * By which of its offers a thing is bought: the preferred, or else that of the supplier whom the thing names, or the
 * first where it names nobody.
 */
export function usualOffer<Offer extends { preferred: boolean; supplierId: number }>(
  offers: readonly Offer[],
  supplierId: number | null,
): Offer | undefined {
  return (
    offers.find(({ preferred }) => preferred) ??
    (supplierId === null ? offers[0] : offers.find((offer) => offer.supplierId === supplierId))
  );
}

/** A price of 0 stands for one that nobody knows yet: it is never the least dear, and an order at it says so. */
export const isPriceKnown = (price: DecimalText): boolean => !new Exact(price).isZero();

export interface OfferFault {
  /** 'breaks.1.from' or 'minimum' */
  field: string;
  /** names the line, counted from 1, and says what to do */
  sentence: string;
}

const most = '1000000000000';

/** What is wrong with an offer, in the order of its lines; nothing where it is sound. */
export function offerFaults({ minimum, multiple, breaks }: OfferTerms): OfferFault[] {
  if (breaks.length === 0) {
    return [{ field: 'breaks', sentence: 'Give at least one price.' }];
  }
  const ofLines = breaks.flatMap((each, at) => lineFaults(each, breaks[at - 1], at));
  return ofLines.length > 0 ? ofLines : minimumFaults(minimum, multiple, breaks[0]?.from ?? '0');
}

function lineFaults(here: OfferBreak, before: OfferBreak | undefined, at: number): OfferFault[] {
  if (before === undefined) return [];
  const [from, price] = [new Exact(here.from), new Exact(here.price)];
  const say = (name: string, sentence: string) => [{ field: `breaks.${at}.${name}`, sentence }];
  const [line, above] = [`Line ${at + 1}`, `line ${at}`];
  if (from.eq(before.from)) {
    return say('from', `${line} begins where ${above} begins. Keep one of the two.`);
  }
  if (from.lt(before.from)) {
    return say('from', `${line} begins below ${above}. Put the lines in order.`);
  }
  if (price.lte(before.price)) return [];
  return say(
    'price',
    `${line} costs more than ${above}, although it is for more. Lower its price, or leave ${line.toLowerCase()} out.`,
  );
}

function minimumFaults(
  minimum: DecimalText | null,
  multiple: DecimalText | null,
  first: DecimalText,
): OfferFault[] {
  const least = minimum ?? multiple;
  if (minimum !== null && multiple !== null && !new Exact(minimum).mod(multiple).isZero()) {
    return [
      {
        field: 'minimum',
        sentence: 'The minimum cannot be had in whole packs. Enter a multiple of the pack.',
      },
    ];
  }
  if (least === null ? new Exact(first).lte(1) : new Exact(first).lte(least)) return [];
  return [
    {
      field: 'breaks.0.from',
      sentence: 'Line 1 begins above the least that is sold, which would have no price. Lower it.',
    },
  ];
}

export interface CheckedOffer {
  minimum: Decimal;
  /** null where any quantity is sold */
  multiple: Decimal | null;
  breaks: { from: Decimal; price: Decimal }[];
}

/** Reads an offer. @throws InvalidInput naming the first field that is wrong */
export function checkOffer(offer: OfferTerms): CheckedOffer {
  const breaks = offer.breaks.map(({ from, price }, at) => ({
    from: readDecimal(from, `breaks.${at}.from`, { min: 0, max: most }),
    price: readDecimal(price, `breaks.${at}.price`, { min: 0, max: most, places: 4 }),
  }));
  const minimum = readDecimal(offer.minimum ?? '0', 'minimum', { min: 0, max: most });
  const multiple =
    offer.multiple === null ? null : readDecimal(offer.multiple, 'multiple', { max: most });
  if (multiple?.lte(0)) throw new InvalidInput('multiple', 'Enter a pack above 0.');
  const [fault] = offerFaults(offer);
  if (fault) throw new InvalidInput(fault.field, fault.sentence);
  return { minimum, multiple, breaks };
}
