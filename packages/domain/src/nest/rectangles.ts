import { InvalidInput, NotWorkable } from '../errors/domain-error.ts';
import { box } from './rectangles-cuts.ts';
import { slackMm, smallestAlike, type WholeSizes } from './rectangles-instance.ts';
import { piecesOf, type WholePiece } from './rectangles-place.ts';
import { type Search, startSearch } from './rectangles-search.ts';
import { isMirrored } from './rectangles-snug.ts';

/** In mm. */
export interface RectangleSize {
  width: number;
  height: number;
}

export interface RectangleOptions {
  /** least distance between two pieces, in mm; 0 unless given */
  gap?: number | undefined;
  /** how many cuts the search may look at; the same number always gives the same layout */
  steps?: number | undefined;
}

/** A piece's lower left corner in mm, and whether it has a quarter turn. */
export interface PlacedRectangle {
  x: number;
  y: number;
  turned: boolean;
}

export interface RectangleLayout {
  pieces: PlacedRectangle[];
  /** no layout gives more */
  bound: number;
}

const mostPieces = 20_000;
const defaultSteps = 1_000_000;

/**
 * Lays equal rectangles in a rectangle, quarter turns allowed, as many as can be found: proved to be
 * the most where their number reaches `bound`. Deterministic. Sides from 0.001 to 100,000 mm.
 * @throws InvalidInput for a side or gap that makes no sense · NotWorkable beyond 20,000 pieces
 */
export function packRectangles(
  container: RectangleSize,
  piece: RectangleSize,
  { gap = 0, steps = defaultSteps }: RectangleOptions = {},
): RectangleLayout {
  checkSizes(container, piece, gap);
  // A gap that belongs to each piece, and once more to the container, lies between pieces only.
  const [width, height] = [container.width + gap, container.height + gap];
  const [a, b] = [piece.width + gap, piece.height + gap];
  if (Math.floor((width + slackMm) / a) * Math.floor((height + slackMm) / b) > mostPieces) {
    throw new NotWorkable('More than 20,000 pieces fit: work out a smaller panel.');
  }
  const [long, short] = [Math.max(a, b), Math.min(a, b)];
  const sizes = smallestAlike(width, height, long, short);
  const byArea = Math.floor((width * height) / (a * b) + slackMm);
  const { pieces, bound } = packWhole(sizes, byArea, steps);
  return { pieces: inMillimetres(pieces, sizes, { long, short, wide: a >= b }), bound };
}

function checkSizes(container: RectangleSize, piece: RectangleSize, gap: number): void {
  const sides = { ...container, pieceWidth: piece.width, pieceHeight: piece.height };
  for (const [field, side] of Object.entries(sides)) {
    if (side >= 0.001 && side <= 100_000) continue;
    throw new InvalidInput(field, 'Write the side as 0.001 to 100,000 mm.');
  }
  if (!(gap >= 0 && gap <= 100)) throw new InvalidInput('gap', 'Write the gap as 0 to 100 mm.');
}

function packWhole(sizes: WholeSizes, byArea: number, steps: number) {
  const search = startSearch(sizes);
  const root = box(sizes.width, sizes.height);
  const whole = search.known(root);
  if (!whole) return { pieces: [], bound: 0 };
  // Rounded to whole sizes, the container may have more room than it really has.
  whole.most = Math.min(whole.most, byArea);
  // The most is often reached, and then it is found soon; if not, more and more than so far.
  search.reaches(whole, whole.most, steps / 2);
  while (whole.found < whole.most && search.reaches(whole, whole.found + 1, steps / 2)) continue;
  return { pieces: piecesOf(root, sizes, lookInto(search)), bound: whole.most };
}

const lookInto = (search: Search) => (ell: Parameters<Search['known']>[0]) => {
  const [known, snug] = [search.known(ell), search.snug(ell)];
  return known && snug && { known, mirrored: isMirrored(snug) };
};

/**
 * From whole sizes back to mm: every piece moves to the left and down as far as those that end
 * before it begins. A row of them is no longer than in whole sizes, where the same rows fit.
 */
function inMillimetres(
  pieces: readonly WholePiece[],
  whole: WholeSizes,
  piece: { long: number; short: number; wide: boolean },
): PlacedRectangle[] {
  const [across, up] = [movedBack(pieces, 'x', whole, piece), movedBack(pieces, 'y', whole, piece)];
  return pieces.map(({ turned }, at) => ({
    x: across[at] as number,
    y: up[at] as number,
    // A piece that is higher than wide lies along x only when it is turned.
    turned: piece.wide ? turned : !turned,
  }));
}

function movedBack(
  pieces: readonly WholePiece[],
  axis: 'x' | 'y',
  whole: WholeSizes,
  piece: { long: number; short: number },
): number[] {
  const isLong = ({ turned }: WholePiece) => turned === (axis === 'y');
  const numbers = pieces.map((each, at) => ({ at, start: each[axis], long: isLong(each) }));
  const starts = [...numbers].sort((a, b) => a.start - b.start);
  const endOf = ({ start, long }: (typeof numbers)[number]) =>
    start + (long ? whole.long : whole.short);
  const ends = [...numbers].sort((a, b) => endOf(a) - endOf(b));
  const places: number[] = [];
  let reached = 0;
  let ended = 0;
  for (const { at, start } of starts) {
    for (let end = ends[ended]; end && endOf(end) <= start; end = ends[ended]) {
      reached = Math.max(
        reached,
        (places[end.at] as number) + (end.long ? piece.long : piece.short),
      );
      ended += 1;
    }
    places[at] = reached;
  }
  return places;
}
