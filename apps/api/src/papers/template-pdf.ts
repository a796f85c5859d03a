import { outlineBounds, outlinePath, safeLine, type Outline } from '@hidewright/domain';
import { blankPaper, bytesOf, ink, inkSoft, type Paper } from './paper.ts';
import {
  edge,
  overlap,
  type SheetName,
  type Tile,
  tilingFor,
  type Tiling,
} from './template-sheets.ts';

/** The outline of a pattern, as it is printed to be cut out or drawn on. */
export interface TemplatePaper {
  patternName: string;
  versionNumber: number;
  /** "round, 95 mm" */
  description: string;
  shopName: string;
  /** YYYY-MM-DD */
  day: string;
  outline: Outline;
  safeMarginMm: number;
  paper: SheetName;
}

/** Points in a millimetre. */
const point = 72 / 25.4;
/** White around the outline within its drawing, in mm. */
const air = 4;
const lightLine = '#B5AC99';

/** Draws a template true to size, over as many sheets as it takes; the same pattern always gives the same bytes. */
export function drawTemplate(template: TemplatePaper): Promise<Uint8Array> {
  const bounds = outlineBounds(template.outline);
  const drawing = {
    width: bounds.maxX - bounds.minX + 2 * air,
    height: bounds.maxY - bounds.minY + 2 * air,
  };
  const tiling = tilingFor(drawing, template.paper);
  const size: [number, number] = [tiling.sheet.width * point, tiling.sheet.height * point];
  const made = new Date(`${template.day}T12:00:00Z`);
  const title = `Template of ${template.patternName}`;
  const paper = blankPaper(title, template.shopName, made, { size, margin: 0 });
  const paths = [outlinePath(template.outline), safePath(template)] as const;
  tiling.tiles.forEach((tile, at) => {
    if (at > 0) paper.addPage({ size, margin: 0 });
    const origin = { x: bounds.minX - air + tile.x, y: bounds.minY - air + tile.y };
    drawWindow(paper, tiling, origin, paths);
    drawNeighbours(paper, tiling, tile);
    drawHead(paper, template, tiling, tile);
    drawCheckLine(paper, tiling);
  });
  return bytesOf(paper);
}

function safePath({ outline, safeMarginMm }: TemplatePaper): string {
  return safeLine(outline, safeMarginMm)
    .map((line) => `M ${line.map(({ x, y }) => `${x.toFixed(3)} ${y.toFixed(3)}`).join(' L ')}`)
    .join(' ');
}

/** The part of the drawing that begins at `origin`, in mm, with nothing of it outside its window. */
function drawWindow(
  paper: Paper,
  { window }: Tiling,
  origin: { x: number; y: number },
  [cut, safe]: readonly [string, string],
): void {
  paper.save().scale(point);
  paper.rect(edge.side, edge.top, window.width, window.height).clip();
  paper.translate(edge.side - origin.x, edge.top - origin.y);
  paper.lineWidth(0.2).strokeColor(ink).path(cut).stroke();
  if (safe !== '') paper.strokeColor(inkSoft).dash(2, { space: 1 }).path(safe).stroke().undash();
  paper.restore();
}

/** Where the next sheet is laid over this one. */
function drawNeighbours(paper: Paper, { window, columns, rows }: Tiling, tile: Tile): void {
  const [right, bottom] = [edge.side + window.width, edge.top + window.height];
  paper.save().scale(point).lineWidth(0.15).strokeColor(lightLine).dash(1, { space: 1 });
  const upright = (x: number) => paper.moveTo(x, edge.top).lineTo(x, bottom).stroke();
  const level = (y: number) => paper.moveTo(edge.side, y).lineTo(right, y).stroke();
  if (tile.column > 0) upright(edge.side + overlap);
  if (tile.column < columns - 1) upright(right - overlap);
  if (tile.row > 0) level(edge.top + overlap);
  if (tile.row < rows - 1) level(bottom - overlap);
  paper.undash().restore();
}

function drawHead(paper: Paper, template: TemplatePaper, tiling: Tiling, tile: Tile): void {
  const { columns, rows, sheet } = tiling;
  const width = (sheet.width - 2 * edge.side) * point;
  const line = { width, height: 16, ellipsis: true, lineBreak: false };
  const left = edge.side * point;
  paper.font('strong').fontSize(12).fillColor(ink);
  paper.text(`${template.patternName}, version ${template.versionNumber}`, left, 8 * point, line);
  const several = columns * rows > 1;
  const place = several
    ? `; sheet ${tile.row * columns + tile.column + 1} of ${columns * rows}: row ${tile.row + 1}, column ${tile.column + 1}, glued ${overlap} mm over each other`
    : '';
  paper.font('plain').fontSize(9).fillColor(inkSoft);
  const dashed = `dashed: ${template.safeMarginMm} mm from the cut`;
  paper.text(`${template.description}; ${dashed}; true to size${place}`, left, 14 * point, line);
}

const checkMm = 100;
const arrowMm = 30;

/** A line to lay a ruler on, and the way the backbone ran. */
function drawCheckLine(paper: Paper, { sheet }: Tiling): void {
  const y = sheet.height - edge.bottom + 9;
  const left = edge.side;
  paper.save().scale(point).lineWidth(0.3).strokeColor(ink);
  paper
    .moveTo(left, y)
    .lineTo(left + checkMm, y)
    .stroke();
  for (let at = 0; at <= checkMm; at += 10) {
    paper
      .moveTo(left + at, y)
      .lineTo(left + at, y - (at % 50 === 0 ? 3 : 2))
      .stroke();
  }
  const tip = sheet.width - edge.side;
  paper
    .moveTo(tip - arrowMm, y)
    .lineTo(tip, y)
    .stroke();
  paper
    .moveTo(tip - 3, y - 1.5)
    .lineTo(tip, y)
    .lineTo(tip - 3, y + 1.5)
    .stroke();
  paper.restore();
  const below = (y + 1.5) * point;
  paper.font('plain').fontSize(9).fillColor(ink);
  const check = 'Check: this line is 100 mm. If it is not, print at 100 %, not fitted to the page.';
  paper.text(check, left * point, below, { lineBreak: false });
  const words = { width: arrowMm * point, lineBreak: false };
  paper.text('along the spine', (tip - arrowMm) * point, (y - 6) * point, words);
}
