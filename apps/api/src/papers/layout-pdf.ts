import {
  blankPaper,
  bytesOf,
  ink,
  inkSoft,
  russet,
  sheet,
  stitchAcross,
  ticketHead,
  type Paper,
} from './paper.ts';

/** How the pieces lie, for the wall beside the press. All lengths in mm, y running down. */
export interface LayoutPaper {
  shopName: string;
  patternName: string;
  /** "26 from a panel, every other row turned" */
  about: string;
  /** YYYY-MM-DD */
  day: string;
  outlinePath: string;
  placements: { x: number; y: number; rot: number }[];
  widthMm: number;
  heightMm: number;
  figures: { word: string; figure: string }[];
}

const room = { top: 168, height: 460 };

/** Draws a layout as large as the sheet allows, numbered in cutting order, with its figures below. */
export function drawLayout(layout: LayoutPaper): Promise<Uint8Array> {
  const made = new Date(`${layout.day}T12:00:00Z`);
  const paper = blankPaper(`Layout of ${layout.patternName}`, layout.shopName, made);
  ticketHead(paper, {
    number: 'Layout',
    shop: layout.shopName,
    name: layout.patternName,
    about: layout.about,
  });
  stitchAcross(paper, 148);
  const scale = Math.min(
    (sheet.right - sheet.left) / layout.widthMm,
    room.height / layout.heightMm,
  );
  drawContainer(paper, layout, scale);
  layout.placements.forEach((placement, at) =>
    drawPiece(paper, layout.outlinePath, placement, at, scale),
  );
  const below = room.top + layout.heightMm * scale + 12;
  drawSpine(paper, below);
  drawFigures(paper, layout.figures, below + 26);
  return bytesOf(paper);
}

function drawContainer(paper: Paper, { widthMm, heightMm }: LayoutPaper, scale: number): void {
  paper.save().translate(sheet.left, room.top).lineWidth(1);
  paper.rect(0, 0, widthMm * scale, heightMm * scale).fillAndStroke('#EAD3B5', '#8C7F63');
  paper.restore();
}

function drawPiece(
  paper: Paper,
  outlinePath: string,
  { x, y, rot }: LayoutPaper['placements'][number],
  at: number,
  scale: number,
): void {
  paper.save().translate(sheet.left, room.top).scale(scale).translate(x, y);
  paper
    .save()
    .rotate(rot)
    .lineWidth(0.75 / scale);
  paper.path(outlinePath).fillAndStroke(russet, '#FFFDF8').restore();
  paper
    .scale(1 / scale)
    .font('strong')
    .fontSize(8)
    .fillColor('#FFFFFF');
  paper.text(String(at + 1), -20, -5, { width: 40, align: 'center', lineBreak: false });
  paper.restore();
}

function drawSpine(paper: Paper, y: number): void {
  paper.font('plain').fontSize(9).fillColor(inkSoft);
  paper.text('along the spine', sheet.left, y, { lineBreak: false });
  paper.save().strokeColor(inkSoft).lineWidth(1);
  const [from, to, middle] = [sheet.left + 76, sheet.left + 150, y + 6];
  paper.moveTo(from, middle).lineTo(to, middle);
  paper
    .moveTo(to - 6, middle - 3)
    .lineTo(to, middle)
    .lineTo(to - 6, middle + 3);
  paper.stroke().restore();
}

function drawFigures(paper: Paper, figures: LayoutPaper['figures'], top: number): void {
  figures.forEach(({ word, figure }, at) => {
    const x = sheet.left + (at % 3) * 165;
    const y = top + Math.floor(at / 3) * 34;
    paper.font('plain').fontSize(9).fillColor(inkSoft).text(word, x, y, { lineBreak: false });
    paper
      .font('strong')
      .fontSize(11)
      .fillColor(ink)
      .text(figure, x, y + 12, { lineBreak: false });
  });
}
