import type { Day } from '../promise/day.ts';
import { drawOrMend, lessDrafted, type Standing } from './check-items.ts';
import type { LeatherNeed, LeatherStock, RackLot } from './check-stock.ts';
import { chooseLots, type LotOffer, shadesOf } from './choose-lots.ts';
import {
  areaForPieces,
  panelArea,
  type PiecesOfLot,
  piecesFromLot,
  usableArea,
} from './pieces-from-lot.ts';

export interface LotTaken {
  lot: RackLot;
  pieces: number;
  by: PiecesOfLot['by'];
  /** panels or strips to take, or pieces where it is cut as it lies */
  units: number;
  /** thousandths of mm² */
  area: number;
  /** how many more units stay on it */
  unitsLeft: number;
}

export interface LeatherFacts {
  leather: LeatherStock;
  takes: LotTaken[];
  /** tags of lots that have something free, of which no panel can be cut whole */
  tooSmall: string[];
  /** tags of lots whose usable share holds no panel beside what is gone of it */
  tooLittle: string[];
  /** more than one where they would mix */
  shades: string[];
  likeShade: string | null;
  piecesNeeded: number;
  /** to be cut from what comes in time, and from nothing at all yet */
  piecesComing: number;
  piecesShort: number;
  /** areas in thousandths of mm² */
  standing: Standing;
}

interface Offered {
  lot: RackLot;
  from: PiecesOfLot;
}

/** Draws a run's pieces from the lots, and what they do not give from leather that is yet to come. */
export function drawLeather(
  leather: LeatherStock,
  need: LeatherNeed,
  when: { pieces: number; day: Day; today: Day },
): { facts: LeatherFacts; left: LeatherStock } {
  const panel = panelArea(need.cut);
  const offered = leather.lots.map((lot): Offered => {
    const laid = need.laid.get(lot.lotId) ?? null;
    return { lot, from: piecesFromLot(lot, need.cut, laid, panel) };
  });
  const offers = offered.map(toOffer);
  const fromLots = Math.min(when.pieces, notOwed(leather, need, offered));
  const chosen = chooseLots(offers, fromLots, need.likeShade);
  const takes = chosen.flatMap(({ lotId, pieces }) => {
    const each = offered.find(({ lot }) => lot.lotId === lotId);
    return each === undefined ? [] : [takeFrom(each, pieces)];
  });
  const cut = takes.reduce((sum, { pieces }) => sum + pieces, 0);
  const rest = drawRest(leather, need, { ...when, pieces: when.pieces - cut });
  const facts = {
    leather,
    takes,
    tooSmall: tagsOf(offered.filter((each) => givesNone(each, 'panels'))),
    tooLittle: tagsOf(offered.filter((each) => givesNone(each, 'area'))),
    shades: shadesOf(offers, chosen),
    likeShade: need.likeShade,
    piecesNeeded: when.pieces,
    piecesComing: rest.inTime,
    piecesShort: when.pieces - cut - rest.inTime,
    standing: withLots(rest.standing, takes, areaOfOffers(offered)),
  };
  return { facts, left: leftOf(leather, takes, rest) };
}

const toOffer = ({ lot: { lotId, shade, receivedOn }, from: { pieces } }: Offered): LotOffer => ({
  lotId,
  shade,
  receivedOn,
  pieces,
});

const givesNone = ({ lot, from }: Offered, by: PiecesOfLot['by']): boolean =>
  from.by === by && from.pieces === 0 && lot.freeArea > 0;

const tagsOf = (offered: readonly Offered[]): string[] => offered.map(({ lot }) => lot.tag);

/**
 * Pieces that may be cut now without taking what jobs taken on before still need. Nobody knows yet which lots those
 * will be cut from: they are given the lots of which this run has the least.
 */
function notOwed({ owed }: LeatherStock, { cut, laid }: LeatherNeed, offered: Offered[]): number {
  const all = offered.reduce((sum, { from }) => sum + from.pieces, 0);
  if (owed === 0) return all;
  let left = owed;
  const panel = panelArea(cut);
  return leastYieldFirst(offered).reduce((pieces, { lot, from, usable }) => {
    const gone = Math.min(left, usable);
    left -= gone;
    if (gone === 0) return pieces;
    const less = { ...lot, freeArea: lot.freeArea - gone };
    const still = piecesFromLot(less, cut, laid.get(lot.lotId) ?? null, panel).pieces;
    return pieces - from.pieces + still;
  }, all);
}

/** By the pieces for each part of it that can be cut; what cannot be cut at all is given first. */
const leastYieldFirst = (offered: readonly Offered[]): (Offered & { usable: number })[] =>
  offered
    .map((each) => ({ ...each, usable: usableArea(each.lot) }))
    .map((each) => ({ each, yields: each.from.pieces / Math.max(1, each.usable) }))
    .sort((a, b) => a.yields - b.yields)
    .map(({ each }) => each);

function takeFrom({ lot, from }: Offered, pieces: number): LotTaken {
  const units = Math.ceil(pieces / from.perUnit);
  return {
    lot,
    pieces,
    by: from.by,
    units,
    area: areaForPieces(lot, from, pieces),
    unitsLeft: Math.floor(from.pieces / from.perUnit) - units,
  };
}

interface Rest {
  standing: Standing;
  left: LeatherStock['pool'];
  /** pieces from what comes in time */
  inTime: number;
}

/** Leather that is yet to come is drawn by whole panels. */
function drawRest(
  { pool, buying }: LeatherStock,
  { cut }: LeatherNeed,
  { pieces, day, today }: { pieces: number; day: Day; today: Day },
): Rest {
  const panel = panelArea(cut);
  const needed = Math.ceil(pieces / cut.pieces) * panel;
  const { standing, left } = drawOrMend({ pool, buying, needed, day, today });
  const panelsInTime = Math.floor((needed - standing.short) / panel);
  return { standing, left, inTime: Math.min(pieces, panelsInTime * cut.pieces) };
}

const areaOfOffers = (offered: readonly Offered[]): number =>
  offered.reduce((sum, { lot, from }) => sum + areaForPieces(lot, from, from.pieces), 0);

function withLots(rest: Standing, takes: readonly LotTaken[], onRack: number): Standing {
  const taken = takes.reduce((sum, { area }) => sum + area, 0);
  return {
    ...rest,
    needed: taken + rest.needed,
    now: taken,
    free: rest.short > 0 ? taken + rest.needed - rest.short : onRack + rest.free,
  };
}

function leftOf(leather: LeatherStock, takes: readonly LotTaken[], rest: Rest): LeatherStock {
  const lots = leather.lots.map((lot) => {
    const taken = takes.find((take) => take.lot.lotId === lot.lotId);
    return taken === undefined ? lot : { ...lot, freeArea: lot.freeArea - taken.area };
  });
  return {
    ...leather,
    lots,
    pool: rest.left,
    buying: lessDrafted(leather.buying, rest.standing.drafted),
  };
}
