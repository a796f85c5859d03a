import { type DecimalText, readDecimal, readWhole, toPlaces } from '../numbers/decimal-text.ts';
import { choosePlate, dearerPaysFrom, type PlateChoice, type PlateOffer } from './plate-choice.ts';

export interface PlateAdviceAsked {
  /** impressions of this run, 1 or more */
  now: number;
  /** runs expected after it, over the term; 0 or more */
  repeats: number;
  /** impressions of each of them; 1 or more where there are any */
  perRepeat: number;
  /** impressions that the plate in the slot has left; 0 where none is there */
  left: number;
  /** new plates, one of each metal at most */
  offers: readonly Omit<PlateOffer, 'used'>[];
}

export interface PlatesBought {
  plates: number;
  /** 2 places */
  cost: DecimalText;
  /** how often a worn plate is changed for the next one on the way */
  changes: number;
  /** impressions before the first of these; null where there is none */
  firstChangeAfter: number | null;
}

export interface PlateAdvice {
  impressionsInAll: number;
  /** the plate in the slot lasts this run; never where none is there */
  lastsNow: boolean;
  /** and the repeats too */
  lastsInAll: boolean;
  /** by metal, in the order of the offers */
  metals: { metal: string; now: PlatesBought; inAll: PlatesBought }[];
  /** null where nothing need be bought, or nothing is offered */
  leastNow: PlateChoice | null;
  leastInAll: PlateChoice | null;
  /** against the metal with the lowest price: from how many impressions on, those of the slot included */
  turns: { cheap: string; dear: string; from: number | null }[];
}

/**
 * Which metal a new plate should be. The plate in the slot is worn out first, whatever it is made of, since it is paid
 * for; after it plates of one metal are bought, and each time one is worn out the press stops for the next.
 * @throws InvalidInput naming the field
 */
export function advisePlate(asked: PlateAdviceAsked): PlateAdvice {
  const { offers } = asked;
  const now = readWhole(asked.now, 'now', 1, 100_000_000);
  const repeats = readWhole(asked.repeats, 'repeats', 0, 1000);
  const perRepeat = readWhole(asked.perRepeat, 'perRepeat', repeats === 0 ? 0 : 1, 100_000_000);
  const left = readWhole(asked.left, 'left', 0, 1_000_000_000);
  const inAll = readWhole(now + repeats * perRepeat, 'repeats', 1, 1_000_000_000);
  return {
    impressionsInAll: inAll,
    lastsNow: left >= now,
    lastsInAll: left >= inAll,
    metals: offers.map((offer, at) => ({
      metal: offer.metal,
      now: bought(now, left, offer, `offers.${at}`),
      inAll: bought(inAll, left, offer, `offers.${at}`),
    })),
    leastNow: least(now - left, offers),
    leastInAll: least(inAll - left, offers),
    turns: turnsOf(offers, left),
  };
}

function bought(
  impressions: number,
  left: number,
  offer: PlateAdviceAsked['offers'][number],
  field: string,
): PlatesBought {
  const life = readWhole(offer.life, `${field}.life`, 1, 1_000_000_000);
  const price = readDecimal(offer.price, `${field}.price`, { min: 0 });
  const plates = Math.ceil(Math.max(0, impressions - left) / life);
  const first = left > 0 ? left : life;
  return {
    plates,
    cost: toPlaces(price.times(plates), 2),
    changes: left > 0 ? plates : plates - 1,
    firstChangeAfter: first < impressions ? first : null,
  };
}

const least = (impressions: number, offers: PlateAdviceAsked['offers']): PlateChoice | null =>
  impressions <= 0 || offers.length === 0 ? null : choosePlate(impressions, offers);

function turnsOf(offers: PlateAdviceAsked['offers'], left: number): PlateAdvice['turns'] {
  const byPrice = offers
    .map((offer) => ({ offer, price: readDecimal(offer.price, 'price', { min: 0 }) }))
    .sort((a, b) => a.price.cmp(b.price) || b.offer.life - a.offer.life);
  const [cheapest, ...dearer] = byPrice;
  if (cheapest === undefined) return [];
  return dearer.map(({ offer }) => {
    const from = cheapest.price.isZero() ? null : dearerPaysFrom(cheapest.offer, offer);
    const turn = { cheap: cheapest.offer.metal, dear: offer.metal };
    return { ...turn, from: from === null ? null : left + from };
  });
}
