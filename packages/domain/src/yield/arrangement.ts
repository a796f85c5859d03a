import type { NestPlacement, RowNumbers } from '../nest/problem.ts';
import type { Lie, Placement, Turned } from './layout.ts';

/** Places closer than this across the rows are one row, in mm. */
const sameRow = 0.05;

/** Row by row and along each row, as a hand places the die. */
export function inCuttingOrder(
  placements: readonly NestPlacement[],
  directionDeg: number,
): Placement[] {
  return rowsOf(placements, directionDeg).flat();
}

/** The pieces by rows, each from its beginning; across the rows first, then along. */
function rowsOf(placements: readonly NestPlacement[], directionDeg: number): Placement[][] {
  const angle = (directionDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const along = ({ x, y }: NestPlacement) => x * cos + y * sin;
  const across = ({ x, y }: NestPlacement) => y * cos - x * sin;
  const rows: Placement[][] = [];
  let at = -Infinity;
  for (const placement of [...placements].sort((a, b) => across(a) - across(b))) {
    if (across(placement) - at > sameRow) rows.push([]);
    at = across(placement);
    rows.at(-1)?.push(placement);
  }
  return rows.map((row) => row.sort((a, b) => along(a) - along(b)));
}

type Arrangement = Pick<
  Lie,
  'pitchMm' | 'rowStepMm' | 'shiftMm' | 'rows' | 'piecesPerRow' | 'rowPieces' | 'turned'
>;

/** The numbers that go on the ticket; a layout that is not in rows has none. */
export function arrangement(
  numbers: RowNumbers | null,
  placements: readonly Placement[],
): Arrangement {
  if (!numbers) {
    const none = { pitchMm: null, rowStepMm: null, shiftMm: null };
    const count = placements.length === 0 ? 0 : null;
    return {
      ...none,
      rows: count,
      piecesPerRow: count,
      rowPieces: null,
      turned: turnedOf([[...placements]]),
    };
  }
  const rows = rowsOf(placements, numbers.directionDeg);
  return {
    pitchMm: tidy(numbers.pitchMm),
    rowStepMm: tidy(numbers.rowStepMm),
    shiftMm: tidy(remainder(numbers.shiftMm, numbers.pitchMm)),
    rows: rows.length,
    piecesPerRow: Math.max(0, ...rows.map((row) => row.length)),
    rowPieces: rows.map((row) => row.length),
    turned: turnedOf(rows),
  };
}

function turnedOf(rows: readonly Placement[][]): Turned {
  const turns = rows.map((row) => new Set(row.map(({ rot }) => Math.round(rot) % 360)));
  if (new Set(turns.flatMap((row) => [...row])).size <= 1) return 'none';
  return turns.every((row) => row.size === 1) ? 'every other row' : 'every other piece';
}

const remainder = (value: number, of: number): number =>
  of > 0 ? ((value % of) + of) % of : value;

const tidy = (value: number): number => Math.round(value * 1e4) / 1e4;
