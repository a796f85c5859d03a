import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact } from '../numbers/decimal-text.ts';

/** What a pattern is cut from, as its layout says: so many pieces from a panel or strip of such an area. */
export interface CutFrom {
  pieces: number;
  areaMm2: DecimalText;
  /** null where the sides are not known */
  sides: { widthMm: number; heightMm: number } | null;
}

/** A lot on the rack as far as cutting goes. */
export interface LotToCut {
  freeAreaMm2: DecimalText;
  /** as measured when it came */
  measuredAreaMm2: DecimalText;
  /** the share of it that can be cut where nothing is drawn */
  usablePercent: DecimalText;
  /** the sides of one panel or strip of the bundle; null for anything else */
  panel: { widthMm: number; heightMm: number } | null;
  /** area inside its drawn edge less its flaws; null where it is not drawn */
  drawnAreaMm2: DecimalText | null;
  /** pieces that a layout on it as drawn gives, of the whole lot; null where none is laid out */
  laid: number | null;
}

export interface PiecesOfLot {
  pieces: number;
  /** how that is known */
  by: 'layout' | 'panels' | 'area';
  /** what one goes to the lot for: a piece, or a panel or strip of so many */
  perUnit: number;
  unitAreaMm2: Decimal;
}

/**
 * How many pieces of a pattern a lot still gives. Laid out as drawn, its layout's count, in proportion to what is
 * free of it; of ready panels, whole ones; otherwise as many of the pattern's panels as the usable share holds
 * beside what is gone already. All by area, but for the layout: a share of waste stays with the lot.
 */
export function piecesFromLot(lot: LotToCut, cut: CutFrom): PiecesOfLot {
  if (lot.laid !== null) return byLayout(lot, lot.laid);
  const perPanel = lot.panel === null ? 0 : panelsWithin(lot.panel, cut);
  return lot.panel !== null && perPanel > 0
    ? byPanels(lot, lot.panel, perPanel * cut.pieces)
    : byArea(lot, cut);
}

/** Area of a lot that goes for so many of its pieces, never more than is free. */
export function areaForPieces(lot: LotToCut, from: PiecesOfLot, pieces: number): Decimal {
  const units = Math.ceil(pieces / from.perUnit);
  // A thousandth of a mm² is the least that the rack's book keeps.
  const area = from.unitAreaMm2.times(units).toDecimalPlaces(3, Exact.ROUND_UP);
  return Exact.min(area, lot.freeAreaMm2);
}

function byLayout(lot: LotToCut, laid: number): PiecesOfLot {
  const share = new Exact(lot.freeAreaMm2).div(lot.measuredAreaMm2);
  return {
    pieces: share.times(laid).floor().toNumber(),
    by: 'layout',
    perUnit: 1,
    unitAreaMm2: laid === 0 ? new Exact(0) : new Exact(lot.measuredAreaMm2).div(laid),
  };
}

function byPanels(
  lot: LotToCut,
  { widthMm, heightMm }: { widthMm: number; heightMm: number },
  perUnit: number,
): PiecesOfLot {
  const unitAreaMm2 = new Exact(widthMm).times(heightMm);
  const panels = new Exact(lot.freeAreaMm2).div(unitAreaMm2).floor().toNumber();
  return { pieces: panels * perUnit, by: 'panels', perUnit, unitAreaMm2 };
}

function byArea(lot: LotToCut, cut: CutFrom): PiecesOfLot {
  const unitAreaMm2 = new Exact(cut.areaMm2);
  const units = usableAreaMm2(lot).div(unitAreaMm2).floor().toNumber();
  return { pieces: units * cut.pieces, by: 'area', perUnit: cut.pieces, unitAreaMm2 };
}

/** What can still be cut of a lot in mm², where no layout says it: its usable share less what is gone. */
export function usableAreaMm2(lot: LotToCut): Decimal {
  const share = new Exact(lot.measuredAreaMm2).times(lot.usablePercent).div(100);
  const usable = lot.drawnAreaMm2 === null ? share : Exact.min(share, lot.drawnAreaMm2);
  const gone = new Exact(lot.measuredAreaMm2).minus(lot.freeAreaMm2);
  return Exact.max(0, Exact.min(usable.minus(gone), lot.freeAreaMm2));
}

/** How many of the pattern's panels lie side by side within one of the bundle, the better way round. */
function panelsWithin(
  { widthMm, heightMm }: { widthMm: number; heightMm: number },
  { sides }: CutFrom,
): number {
  if (sides === null) return 0;
  const within = (width: number, height: number) =>
    Math.floor(width / sides.widthMm) * Math.floor(height / sides.heightMm);
  return Math.max(within(widthMm, heightMm), within(heightMm, widthMm));
}
