import { labelPages, labelSpots, type LabelGrid } from '@hidewright/domain';
import { create } from 'qrcode';
import { blankPaper, bytesOf, ink, inkSoft, type Paper } from './paper.ts';

export interface Label {
  tag: string;
  /** What the code says: the address of the tag, or the tag alone. */
  code: string;
  /** Which leather, or which hardware. */
  name: string;
  /** Form and area, place, the day it came. */
  lines: readonly string[];
}

interface LabelSheet {
  shopName: string;
  /** YYYY-MM-DD */
  day: string;
  grid: LabelGrid;
  /** The label of a begun sheet to begin at. */
  start: number;
  labels: readonly Label[];
}

/** Points in a millimetre. */
const point = 72 / 25.4;
/** White that a code needs around it, in its own modules, as ISO/IEC 18004 asks. */
const quiet = 4;
const insideMm = 2;
const aboveMm = insideMm + 1;
/** Of the size of the name's line. */
const [tagSize, plainSize] = [1.6, 0.9];
const leading = 1.365;

/** The size in points at which a tag, a name and so many lines below them stand whole within a label. */
export function lineSize(heightMm: number, lines: number): number {
  const height = (heightMm - aboveMm - insideMm) * point;
  return Math.min(11, height / (leading * (tagSize + 1 + plainSize * lines)));
}

/** Draws tags at their places, true to size; the same tags always give the same bytes. */
export function drawLabels(sheet: LabelSheet): Promise<Uint8Array> {
  const { grid, labels } = sheet;
  const { widthMm, heightMm } = labelPages[grid.page];
  const page = { size: [widthMm * point, heightMm * point] as [number, number], margin: 0 };
  const paper = blankPaper('Tags', sheet.shopName, new Date(`${sheet.day}T12:00:00Z`), page);
  const spots = labelSpots(grid, labels.length, sheet.start);
  let drawn = 0;
  for (const [at, spot] of spots.entries()) {
    const label = labels[at];
    if (label === undefined) continue;
    for (; drawn < spot.sheet; drawn += 1) paper.addPage(page);
    drawLabel(paper, label, { ...grid, xMm: spot.xMm, yMm: spot.yMm });
  }
  return bytesOf(paper);
}

type Box = Pick<LabelGrid, 'widthMm' | 'heightMm'> & { xMm: number; yMm: number };

function drawLabel(paper: Paper, label: Label, { xMm, yMm, widthMm, heightMm }: Box): void {
  const codeMm = Math.min(heightMm - 2 * insideMm, widthMm * 0.45, 40);
  paper.save();
  paper.rect(xMm * point, yMm * point, widthMm * point, heightMm * point).clip();
  drawCode(paper, label.code, {
    x: (xMm + insideMm) * point,
    y: (yMm + (heightMm - codeMm) / 2) * point,
    side: codeMm * point,
  });
  const left = (xMm + insideMm + codeMm + 1) * point;
  const width = (widthMm - codeMm - 2 * insideMm - 1) * point;
  const line = lineSize(heightMm, label.lines.length);
  let top = (yMm + aboveMm) * point;
  const put = (text: string, size: number, font: 'plain' | 'strong') => {
    paper
      .font(font)
      .fontSize(size)
      .fillColor(font === 'strong' ? ink : inkSoft);
    paper.text(text, left, top, { width, height: size * 1.4, ellipsis: true, lineBreak: false });
    top += size * leading;
  };
  put(label.tag, line * tagSize, 'strong');
  put(label.name, line, 'strong');
  for (const each of label.lines) put(each, line * plainSize, 'plain');
  paper.restore();
}

/** The code as vectors, so that it is as sharp as the printer. */
function drawCode(paper: Paper, text: string, at: { x: number; y: number; side: number }): void {
  const { modules } = create(text, { errorCorrectionLevel: 'M' });
  const module = at.side / (modules.size + 2 * quiet);
  for (let row = 0; row < modules.size; row += 1) {
    for (let column = 0; column < modules.size; column += 1) {
      if (modules.get(row, column) === 0) continue;
      const [x, y] = [at.x + (column + quiet) * module, at.y + (row + quiet) * module];
      paper.rect(x, y, module, module);
    }
  }
  paper.fill('#000000');
}
