import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, readDecimal, readWhole, toPlaces } from '../numbers/decimal-text.ts';

/** Leather that the pieces could be cut from, bought or taken whole. */
export interface CutSource {
  key: string;
  /** pieces that one of it gives, 0 where nothing fits */
  pieces: number;
  areaMm2: DecimalText;
  /** price of one of it, whole */
  price: DecimalText;
  /** how many there are; null for what can be bought in any number */
  available: number | null;
}

export interface CutAdvice {
  key: string;
  /** how many of it the run needs; null where there are not enough or nothing fits */
  needed: number | null;
  /** price of all that must be bought or taken whole */
  wholePrice: DecimalText | null;
  /** the share of that price for the leather that the run uses */
  sharePrice: DecimalText | null;
  /** whole price over the good pieces, 4 places */
  perGoodPiece: DecimalText | null;
  /** leather used for each good piece, in mm², 3 places; null where nothing fits */
  areaPerGoodMm2: DecimalText | null;
  cheapest: boolean;
}

/**
 * What each source costs for a run, in the order given, with the cheapest whole price per good piece
 * marked. The share counts only the part of the last piece of leather that is cut.
 * @param run pieces to cut (1 or more), good pieces among them, decimals of the currency
 * @throws InvalidInput
 */
export function adviseCut(
  run: { cut: number; good: number; minorDigits: number },
  sources: readonly CutSource[],
): CutAdvice[] {
  readWhole(run.cut, 'cut', 1, 10_000_000);
  readWhole(run.good, 'good', 1, run.cut);
  const rows = sources.map((source, at) => adviceOn(run, source, at));
  const prices = rows.flatMap(({ wholePrice }) =>
    wholePrice === null ? [] : [Number(wholePrice)],
  );
  const least = Math.min(...prices);
  const first = rows.findIndex(({ wholePrice }) => Number(wholePrice ?? NaN) === least);
  return rows.map((row, at) => ({ ...row, cheapest: at === first }));
}

function adviceOn(
  { cut, good, minorDigits }: { cut: number; good: number; minorDigits: number },
  source: CutSource,
  at: number,
): Omit<CutAdvice, 'cheapest'> {
  readWhole(source.pieces, `sources.${at}.pieces`);
  const price = readDecimal(source.price, `sources.${at}.price`, { min: 0 });
  const area = readDecimal(source.areaMm2, `sources.${at}.areaMm2`, { min: 0 });
  if (area.isZero()) throw new InvalidInput(`sources.${at}.areaMm2`, 'The leather has no area.');
  const { key, pieces, available } = source;
  if (pieces === 0) return nothingFrom(key, null);
  const areaPerGood = toPlaces(area.times(cut).div(pieces).div(good), 3);
  const needed = Math.ceil(cut / pieces);
  if (available !== null && needed > available) return nothingFrom(key, areaPerGood);
  const whole = price.times(needed);
  return {
    key,
    needed,
    wholePrice: toPlaces(whole, minorDigits),
    sharePrice: toPlaces(price.times(cut).div(pieces), minorDigits),
    perGoodPiece: toPlaces(whole.div(good), 4),
    areaPerGoodMm2: areaPerGood,
  };
}

const nothingFrom = (key: string, areaPerGoodMm2: DecimalText | null) => ({
  key,
  needed: null,
  wholePrice: null,
  sharePrice: null,
  perGoodPiece: null,
  areaPerGoodMm2,
});

/** A lot on the rack and how many pieces it gives. */
export interface RackLot {
  lotId: number;
  tag: string;
  pieces: number;
}

/**
 * Which lots a run is cut from: the one that gives enough with the fewest left over, so that one
 * order comes from one lot; else the fewest, the largest first, the last one as small as does.
 * Null where all together do not give enough.
 */
export function adviseLots(lots: readonly RackLot[], cut: number): RackLot[] | null {
  readWhole(cut, 'cut', 1, 10_000_000);
  const largestFirst = [...lots]
    .filter(({ pieces }) => pieces > 0)
    .sort((a, b) => b.pieces - a.pieces || a.lotId - b.lotId);
  const chosen: RackLot[] = [];
  let left = cut;
  for (;;) {
    const rest = largestFirst.filter((lot) => !chosen.includes(lot));
    const enough = rest.filter(({ pieces }) => pieces >= left).at(-1);
    if (enough) return [...chosen, enough];
    const [largest] = rest;
    if (!largest) return null;
    chosen.push(largest);
    left -= largest.pieces;
  }
}
