import type { SupplierOfferReply } from '@hidewright/contract';
import {
  isPriceKnown,
  judgeQuantity,
  MM2_PER_FT2,
  priceReached,
  type Buying,
  type OrderedQuantity,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import {
  areaPriceText,
  areaText,
  countText,
  moneyText,
  unitPriceText,
} from '../../lib/formatting.ts';
import { areaUnits, isFigure } from '../../lib/units.ts';
import type { Workshop } from '../../lib/workshop.tsx';

/** At which quantities and prices the chosen supplier sells what is on a line. */
export type LineTerms = Pick<SupplierOfferReply, 'unit' | 'minimum' | 'multiple'> & {
  breaks: NonNullable<SupplierOfferReply['breaks']>;
};

type Habit = Pick<Workshop, 'areaUnit'>;

/** What of a supplier's offers is for the chosen thing. */
export function termsOf(
  offers: readonly SupplierOfferReply[],
  of: 'leather' | 'hardware',
  id: unknown,
): LineTerms | undefined {
  const offer = offers.find((each) => each.of === of && isFor(each, id));
  return offer?.breaks && { ...offer, breaks: offer.breaks };
}

const isFor = ({ leatherId, hardwareId }: SupplierOfferReply, id: unknown) =>
  String(leatherId ?? hardwareId) === String(id);

/** The price that the typed quantity reaches; the first one while there is none. */
export function offeredPrice(terms: LineTerms, typed: unknown): string {
  return priceReached(terms, quantityIn(typed) ?? '0');
}

interface PriceField {
  typed: string;
  /** What was offered when it was last filled in. */
  before: string | undefined;
  offered: string;
}

/** What goes into the price field: what is offered now, unless somebody typed another price. */
export function priceToFill({ typed, before, offered }: PriceField): string | undefined {
  const ours = typed.trim() === '' || (before !== undefined && sameFigure(typed, before));
  return ours && !sameFigure(typed, offered) ? offered : undefined;
}

interface TypedLine {
  /** How much of it. */
  much: unknown;
  price: string;
}

/** What is said of a line: how the supplier sells it, as far as that is known, and where it has no price. */
export function lineText(
  terms: LineTerms | undefined,
  { much, price }: TypedLine,
  habit: Habit,
): string {
  const unpriced = isFigure(price) && !isPriceKnown(price);
  return [
    terms && termsText(terms, much, price, habit),
    unpriced && 'Its price is not known: the order asks the supplier for it.',
  ]
    .filter(Boolean)
    .join(' ');
}

/** What is not sold like that, and where more costs less or little more. */
export function termsText(terms: LineTerms, typed: unknown, price: string, habit: Habit): string {
  const quantity = quantityIn(typed);
  if (quantity === undefined) return '';
  const pricedAmount = terms.unit === 'mm2' ? MM2_PER_FT2 : '1';
  const { instead, nextBreak } = judgeQuantity(terms, quantity, pricedAmount);
  // Whoever has a price of their own is not told what the listed ones come to.
  const listed = price.trim() === '' || sameFigure(price, priceReached(terms, quantity));
  return [
    instead && soldText(terms, instead, habit),
    listed && nextBreak && moreText(terms, nextBreak, habit),
  ]
    .filter(Boolean)
    .join(' ');
}

/** Sold in packs of 50: order 400 or 450. */
function soldText(
  terms: LineTerms,
  { less, more, belowMinimum }: NonNullable<OrderedQuantity['instead']>,
  habit: Habit,
): string {
  const { minimum, multiple } = terms;
  const say = sayIn(terms, habit);
  const sold = [
    belowMinimum && minimum !== null && `from ${say(minimum)}`,
    multiple !== null && `in packs of ${say(multiple)}`,
  ];
  const either = less === null ? '' : `${say(less)} or `;
  return `Sold ${sold.filter(Boolean).join(' ')}: order ${either}${say(more)}.`;
}

/** From 500 they cost 0.14 each: 500 cost 6.50 less than 450. */
function moreText(
  terms: LineTerms,
  { plain, more }: NonNullable<OrderedQuantity['nextBreak']>,
  habit: Habit,
): string {
  const say = sayIn(terms, habit);
  const { areaUnit } = habit;
  const each =
    terms.unit === 'mm2'
      ? `it costs ${areaPriceText(more.price, areaUnit)} per ${areaUnits[areaUnit].sign}`
      : `they cost ${unitPriceText(more.price)} each`;
  const [here, there] = [say(plain.quantity), say(more.quantity)];
  return `From ${there} ${each}: ${there} cost ${differenceText(plain, more)} ${here}.`;
}

function differenceText(plain: Buying, more: Buying): string {
  const dearer = new Decimal(more.cost).minus(plain.cost);
  if (dearer.isZero()) return 'the same as';
  const amount = moneyText(dearer.abs().toFixed(2));
  return dearer.lt(0) ? `${amount} less than` : `only ${amount} more than`;
}

const sayIn =
  ({ unit }: LineTerms, { areaUnit }: Habit) =>
  (quantity: string): string =>
    unit === 'mm2' ? areaText(quantity, areaUnit) : countText(Number(quantity));

/** A quantity above 0 that can be reckoned with; nothing while it is half typed or no number. */
function quantityIn(typed: unknown): string | undefined {
  const text = String(typed ?? '').trim();
  return isFigure(text) && Number(text) > 0 && Number(text) <= 1e12 ? text : undefined;
}

const sameFigure = (a: string, b: string): boolean =>
  isFigure(a) && isFigure(b) ? new Decimal(a).eq(b) : a === b;
