import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, readDecimal, readWhole, toPlaces } from '../numbers/decimal-text.ts';

export interface PlateOffer {
  metal: string;
  /** of one new plate */
  price: DecimalText;
  /** impressions that one plate lasts */
  life: number;
  /** impressions of the one in the slot, already paid for; left out where none is there */
  used?: number;
}

export interface PlateChoice {
  metal: string;
  /** of the plates to buy, 2 places */
  cost: DecimalText;
  /** to buy; 0 where the one in the slot lasts */
  plates: number;
}

/**
 * The metal with which so many impressions cost least. A plate in the slot is worn out first, for
 * nothing; after it new ones are bought: ⌈(impressions − life left) / life⌉. At equal cost the one
 * with fewer plates, since every change stops the press; then the one named first.
 * @throws InvalidInput
 */
export function choosePlate(impressions: number, plates: readonly PlateOffer[]): PlateChoice {
  readWhole(impressions, 'impressions', 1, 1_000_000_000);
  const offers = plates.map((plate, at) => priced(impressions, plate, `plates.${at}`));
  const [first, ...others] = offers;
  if (!first) throw new InvalidInput('plates', 'Name at least one plate to choose from.');
  const best = others.reduce((least, each) => (isBetter(each, least) ? each : least), first);
  return { ...best, cost: toPlaces(best.cost, 2) };
}

interface PricedPlate {
  metal: string;
  cost: Decimal;
  plates: number;
}

function priced(impressions: number, plate: PlateOffer, field: string): PricedPlate {
  const life = readWhole(plate.life, `${field}.life`, 1, 1_000_000_000);
  const price = readDecimal(plate.price, `${field}.price`, { min: 0 });
  const left = plate.used === undefined ? 0 : lifeLeft(life, plate.used, field);
  const plates = Math.ceil(Math.max(0, impressions - left) / life);
  return { metal: plate.metal, cost: price.times(plates), plates };
}

function lifeLeft(life: number, used: number, field: string): number {
  readWhole(used, `${field}.used`);
  if (used >= life) {
    throw new InvalidInput(
      `${field}.used`,
      `That plate has no life left: leave out ${field}.used to count with a new one.`,
    );
  }
  return life - used;
}

const isBetter = (a: PricedPlate, b: PricedPlate): boolean =>
  a.cost.lt(b.cost) || (a.cost.eq(b.cost) && a.plates < b.plates);

/**
 * From how many impressions on the dearer plate costs less than buying the cheaper one again and
 * again; null where it never does. Both new: one dear plate, up to its own life, against
 * ⌈n / life⌉ cheap ones.
 * @throws InvalidInput
 */
export function dearerPaysFrom(
  cheap: Pick<PlateOffer, 'price' | 'life'>,
  dear: Pick<PlateOffer, 'price' | 'life'>,
): number | null {
  const life = readWhole(cheap.life, 'cheap.life', 1, 1_000_000_000);
  const lasts = readWhole(dear.life, 'dear.life', 1, 1_000_000_000);
  const price = readDecimal(cheap.price, 'cheap.price', { min: '0.0001' });
  const covered = readDecimal(dear.price, 'dear.price', { min: 0 }).div(price).floor().toNumber();
  const from = covered * life + 1;
  return from <= lasts ? from : null;
}
