import { type DecimalText, Exact, readDecimal, toText } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';
import { bestBuy } from './best-buy.ts';
import { dailyUse, type ItemUse } from './item-use.ts';
import type { LeadTime } from './lead-time.ts';
import { orderQuantity } from './order-quantity.ts';
import { reorderPoint, type ReorderPoint } from './reorder-point.ts';
import { isPriceKnown, type OfferTerms } from './supplier-offer.ts';

/** Of one thing, in pieces, or in mm² of leather. */
export interface OrderInput {
  /** on hand and held for nobody, 0 or more */
  free: number;
  /** promised and not held yet, 0 or more */
  promised: number;
  /** sent to suppliers and not here yet, 0 or more */
  onOrder: number;
  /** on drafts, 0 or more */
  drafted: number;
  /** what the shop always wants to have, 0 or more */
  minimum: number;
  use: ItemUse;
  lead: LeadTime;
  /** the chance that stock lasts until a delivery, above 0 and below 1 */
  service: number;
  /** of placing one order, above 0 */
  orderCost: DecimalText;
  /** keeping a thing for a year costs this share of its price, above 0 */
  holdingRate: number;
  /** how much of it one price is for: 1 piece, or the 92903.04 mm² of a ft² */
  pricedAmount: DecimalText;
  /** as it is sold; the least is a multiple of the pack */
  terms: OfferTerms;
  /** what the owner set instead, null where nothing */
  byHand: { point: number | null; quantity: DecimalText | null };
}

export interface OrderSuggestion {
  /** 'drafted': what is on drafts would do, once they are sent */
  state: 'now' | 'soon' | 'drafted' | 'fine';
  /** free and on order, less what is promised; drafts are not in it */
  position: number;
  /** order when the position falls below it */
  point: number;
  pointBy: 'hand' | 'minimum' | 'use';
  /** by use alone; null where there is too little to go by */
  workedOut: ReorderPoint | null;
  /** what to order now; 0 unless the state is 'now' */
  quantity: DecimalText;
  /** what one order would be today: sold quantities only */
  usual: DecimalText;
  usualBy: 'hand' | 'year' | 'need';
  /** what one priced unit of it costs then, and all of it; 2 places */
  usualPrice: DecimalText;
  usualCost: DecimalText;
  /** that costs least over a year, unrounded; null without use or price */
  economic: number | null;
  /** days until the position is expected to fall below the point; null where no use is expected */
  dueInDays: number | null;
}

/** What comes due within so many days is worth knowing: common practice, no source. */
export const soonDays = 14;

/**
 * Whether a thing should be ordered, and how much. Ordered is when free + on order + drafted −
 * promised falls below the point: set by hand, or the minimum, or the reorder point of its use where
 * that is higher (`reorderPoint`). So much: what is set by hand, or the quantity that costs least over
 * a year (`orderQuantity`, at most a year's use), but never less than what is missing to the point;
 * then raised to what is sold, and on to a price break that costs less (`bestBuy`).
 * @throws InvalidInput
 */
export function orderSuggestion(input: OrderInput): OrderSuggestion {
  const position = positionOf(input);
  const total = position + input.drafted;
  const { point, pointBy, workedOut } = pointOf(input);
  const daily = dailyUse(input.use);
  const dueInDays = daily > 0 ? Math.max(0, Math.floor((total - point) / daily) + 1) : null;
  const due = dueInDays !== null && dueInDays <= soonDays;
  const state =
    total < point ? 'now' : position < point ? 'drafted' : due ? 'soon' : ('fine' as const);
  const order = usualOrder(input, point - total);
  const quantity = state === 'now' ? order.usual : '0';
  return { state, position, point, pointBy, workedOut, quantity, ...order, dueInDays };
}

function positionOf(input: OrderInput): number {
  for (const field of ['free', 'promised', 'onOrder', 'drafted', 'minimum'] as const) {
    readNumber(input[field], field, { min: 0 });
  }
  return input.free + input.onOrder - input.promised;
}

function pointOf({ use, lead, service, minimum, byHand }: OrderInput) {
  const workedOut =
    use.method === 'too little'
      ? null
      : reorderPoint({
          demandMean: use.forecast,
          demandSd: use.sd,
          leadMean: lead.meanDays / use.periodDays,
          leadSd: lead.sdDays / use.periodDays,
          service,
        });
  if (byHand.point !== null) {
    const point = readNumber(byHand.point, 'byHand.point', { min: 0 });
    return { point, pointBy: 'hand' as const, workedOut };
  }
  const byUse = Math.ceil(workedOut?.point ?? 0);
  return byUse > minimum
    ? { point: byUse, pointBy: 'use' as const, workedOut }
    : { point: minimum, pointBy: 'minimum' as const, workedOut };
}

function usualOrder(input: OrderInput, missing: number) {
  const economic = economicOf(input);
  const byHand = input.byHand.quantity;
  const wanted = byHand === null ? (economic ?? 0) : Number(readDecimal(byHand, 'byHand.quantity'));
  // The 6th place keeps what floating point adds from costing a pack.
  const needed = new Exact(Math.max(wanted, missing, 0)).toDecimalPlaces(6);
  const least = needed.isZero() ? (input.terms.multiple ?? '1') : toText(needed);
  const [buy] = bestBuy({
    needed: least,
    pricedAmount: input.pricedAmount,
    offers: [{ ...input.terms, id: 0, leadDays: 0, preferred: true }],
  });
  if (buy === undefined) throw new Error('One offer is asked, and one is answered');
  const {
    quantity: usual,
    price: usualPrice,
    cost: usualCost,
  } = byHand === null ? buy.best : buy.plain;
  const planned = byHand === null ? ('year' as const) : ('hand' as const);
  const usualBy = missing > wanted || wanted === 0 ? ('need' as const) : planned;
  return { usual, usualBy, usualPrice, usualCost, economic };
}

/** Beyond it nobody's use of a year lies, and a ladder of prices is refused. */
const mostReckoned = 1_000_000_000;

/** At most a year's use: what lies longer ages. */
function economicOf({
  use,
  terms,
  orderCost,
  holdingRate,
  pricedAmount,
}: OrderInput): number | null {
  const demand = dailyUse(use) * 365;
  const breaks = terms.breaks
    .map(({ from, price }) => ({ from: Math.ceil(Number(from)), price }))
    .filter(({ from }) => from <= mostReckoned);
  if (demand === 0 || breaks.length === 0 || breaks.some(({ price }) => !isPriceKnown(price)))
    return null;
  // Every cost is multiplied by the priced amount, so that prices per ft² serve quantities in mm².
  const scaledCost = toText(new Exact(orderCost).times(pricedAmount));
  const { quantity } = orderQuantity({ demand, orderCost: scaledCost, holdingRate, breaks });
  return Math.min(quantity, demand);
}
