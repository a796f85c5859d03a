/** In mm. */
export interface Sheet {
  width: number;
  height: number;
}

/** A part of a drawing that goes on one sheet: where it begins in the drawing. */
export interface Tile {
  x: number;
  y: number;
  column: number;
  row: number;
}

export interface Tiling {
  sheet: Sheet;
  /** what is drawn on each sheet */
  window: Sheet;
  columns: number;
  rows: number;
  tiles: Tile[];
}

const sheets = {
  a4: { width: 210, height: 297 },
  letter: { width: 215.9, height: 279.4 },
} as const;
export type SheetName = keyof typeof sheets;

/** Most printers leave so much white; the head and the line to check by stand within it. */
export const edge = { side: 10, top: 22, bottom: 24 };
/** How much of a drawing is on both of two neighbouring sheets, to glue them by. */
export const overlap = 10;

const mostSheets = 24;
/** A PDF page is at most 14,400 points long. */
const longestPage = 5080;

/**
 * How a drawing of a size goes on paper, true to size: on one sheet, upright or across, on several
 * that overlap, or, where that would be more than 24, on one page as large as it needs.
 */
export function tilingFor({ width, height }: Sheet, name: SheetName): Tiling {
  const upright = sheets[name];
  const across = { width: upright.height, height: upright.width };
  const [one, other] = [upright, across].map((sheet) => tiled({ width, height }, sheet)) as [
    Tiling,
    Tiling,
  ];
  const fewer = other.tiles.length < one.tiles.length ? other : one;
  if (fewer.tiles.length <= mostSheets) return fewer;
  return tiled(
    { width, height },
    {
      width: Math.min(longestPage, width + 2 * edge.side),
      height: Math.min(longestPage, height + edge.top + edge.bottom),
    },
  );
}

function tiled(drawing: Sheet, sheet: Sheet): Tiling {
  const window = {
    width: sheet.width - 2 * edge.side,
    height: sheet.height - edge.top - edge.bottom,
  };
  const columns = countOf(drawing.width, window.width);
  const rows = countOf(drawing.height, window.height);
  // The drawing lies in the middle of all its sheets.
  const [left, top] = [
    (drawing.width - joined(columns, window.width)) / 2,
    (drawing.height - joined(rows, window.height)) / 2,
  ];
  const tiles = Array.from({ length: columns * rows }, (_, at) => {
    const [column, row] = [at % columns, Math.floor(at / columns)];
    return {
      column,
      row,
      x: left + column * (window.width - overlap),
      y: top + row * (window.height - overlap),
    };
  });
  return { sheet, window, columns, rows, tiles };
}

const joined = (count: number, window: number): number => count * (window - overlap) + overlap;

const countOf = (side: number, window: number): number =>
  Math.max(1, Math.ceil((side - overlap) / (window - overlap) - 1e-9));
