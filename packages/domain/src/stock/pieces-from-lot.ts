import { type DecimalText, Exact } from '../numbers/decimal-text.ts';

/*
 * Areas of lots are whole thousandths of mm², the least that the rack's book keeps, so that a rack of hundreds of
 * lots is gone through exactly and at once.
 */

/** What a pattern is cut from, as its layout says: so many pieces from a panel or strip of such an area. */
export interface CutFrom {
  pieces: number;
  areaMm2: DecimalText;
  /** null where the sides are not known */
  sides: { widthMm: number; heightMm: number } | null;
}

/** A lot on the rack as far as cutting goes; areas in thousandths of mm². */
export interface LotToCut {
  freeArea: number;
  /** as measured when it came */
  measuredArea: number;
  /** the share of it that can be cut where nothing is drawn: 1 to 100, to the ten-thousandth */
  usablePercent: number;
  /** the sides of one panel or strip of the bundle, or at most of an offcut; null where no sides are known */
  panel: { widthMm: number; heightMm: number } | null;
  /** how many offcuts of at most those sides it is: one may have a corner gone; absent of ready panels and strips */
  offcuts?: number;
  /** how many ready panels or strips of those sides came, where somebody counted them */
  panels?: number;
  /** area inside its drawn edge less its flaws; null where it is not drawn */
  drawnArea: number | null;
}

export interface PiecesOfLot {
  pieces: number;
  /** how that is known */
  by: 'layout' | 'panels' | 'area';
  /** what one goes to the lot for: a piece, or a panel or strip of so many */
  perUnit: number;
  /** so many of those have such an area together, in thousandths of mm² */
  units: { count: number; area: number };
}

/** A panel's area in whole thousandths of mm², any part of one rounded up. */
export const panelArea = (cut: Pick<CutFrom, 'areaMm2'>): number =>
  new Exact(cut.areaMm2).times(1000).ceil().toNumber();

/**
 * How many pieces of a pattern a lot still gives. Laid out as drawn, its layout's count, in proportion to what is
 * free of it; of ready panels, whole ones; of offcuts whose sides are known, as many of the pattern's panels as lie
 * within those sides and within their area; otherwise as many as the usable share holds beside what is gone already.
 * Where sides are known on both hands and none fits, the area gives nothing either.
 * @param laid pieces that a layout on it as drawn gives, of the whole lot; null where none is laid out
 * @param panel the area of the pattern's panel: `panelArea(cut)`
 */
export function piecesFromLot(
  lot: LotToCut,
  cut: CutFrom,
  laid: number | null = null,
  panel = panelArea(cut),
): PiecesOfLot {
  if (laid !== null) return byLayout(lot, laid);
  if (lot.panel === null || cut.sides === null) return byArea(lot, cut.pieces, panel);
  const within = panelsWithin(lot.panel, cut.sides);
  const { offcuts } = lot;
  const most =
    offcuts === undefined
      ? panelsOf(lot, lot.panel) * within
      : Math.min(within * offcuts, Math.floor(lot.measuredArea / panel));
  if (most === 0)
    return { pieces: 0, by: 'panels', perUnit: cut.pieces, units: { count: 1, area: panel } };
  return offcuts === undefined
    ? byBundle(lot, most / within, within * cut.pieces)
    : byBundle(lot, most, cut.pieces);
}

/** Area of a lot in thousandths of mm² that goes for so many of its pieces, never more than is free. */
export function areaForPieces(lot: LotToCut, from: PiecesOfLot, pieces: number): number {
  const { count, area } = from.units;
  const units = Math.ceil(pieces / from.perUnit);
  return Math.min(divided(area, units, count, 'up'), lot.freeArea);
}

function byLayout({ freeArea, measuredArea }: LotToCut, laid: number): PiecesOfLot {
  return {
    pieces: divided(freeArea, laid, measuredArea, 'down'),
    by: 'layout',
    perUnit: 1,
    units: laid === 0 ? { count: 1, area: 0 } : { count: laid, area: measuredArea },
  };
}

/** Where nobody counted them, the area says how many they are: a hundredth short of one more is a rounded figure. */
function panelsOf(
  { panels, measuredArea }: LotToCut,
  { widthMm, heightMm }: NonNullable<LotToCut['panel']>,
): number {
  if (panels !== undefined && panels > 1) return panels;
  const each = new Exact(widthMm).times(heightMm).times(1000);
  return Math.max(1, new Exact(measuredArea).div(each).plus('0.01').floor().toNumber());
}

/**
 * Of so many panels, each goes with its share of what was measured of all of them: its share of an offcut's waste, or
 * of the area that somebody added up for a bundle. What is left of one that is partly used gives no more than its share.
 * A thousandth lost each time one goes costs no panel.
 */
function byBundle(
  { freeArea, measuredArea }: LotToCut,
  count: number,
  perUnit: number,
): PiecesOfLot {
  const left = Math.min(count, divided(freeArea + count, count, measuredArea, 'down'));
  return { pieces: left * perUnit, by: 'panels', perUnit, units: { count, area: measuredArea } };
}

function byArea(lot: LotToCut, perUnit: number, area: number): PiecesOfLot {
  const pieces = Math.floor(usableArea(lot) / area) * perUnit;
  return { pieces, by: 'area', perUnit, units: { count: 1, area } };
}

/**
 * What can still be cut of a lot, where no layout says it: its usable share less what is gone. A ready panel is usable
 * from edge to edge.
 */
export function usableArea(lot: LotToCut): number {
  const { freeArea, measuredArea, usablePercent, drawnArea, panel, offcuts } = lot;
  if (panel !== null && offcuts === undefined) return freeArea;
  const share = divided(measuredArea, Math.round(usablePercent * 10_000), 1_000_000, 'down');
  const usable = Math.min(share, drawnArea ?? share);
  return Math.max(0, Math.min(usable - (measuredArea - freeArea), freeArea));
}

/** What can still be cut of some lots together. */
export const usableOf = (lots: readonly LotToCut[]): number =>
  lots.reduce((sum, lot) => sum + usableArea(lot), 0);

/** `area × part / whole` of whole numbers of 0 or more, rounded; the product may be beyond exact numbers. */
function divided(area: number, part: number, whole: number, rounded: 'up' | 'down'): number {
  const product = area * part + (rounded === 'up' ? whole - 1 : 0);
  if (Number.isSafeInteger(product)) return (product - (product % whole)) / whole;
  const beyond = rounded === 'up' ? BigInt(whole) - 1n : 0n;
  return Number((BigInt(area) * BigInt(part) + beyond) / BigInt(whole));
}

/** How many of the pattern's panels lie side by side within one of the bundle, the better way round. */
function panelsWithin(
  { widthMm, heightMm }: { widthMm: number; heightMm: number },
  sides: NonNullable<CutFrom['sides']>,
): number {
  const within = (width: number, height: number) =>
    Math.floor(width / sides.widthMm) * Math.floor(height / sides.heightMm);
  return Math.max(within(widthMm, heightMm), within(heightMm, widthMm));
}
