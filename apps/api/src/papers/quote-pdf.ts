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
import { printedDay, printedNumber } from './paper-text.ts';

/** A quote as the customer gets it: nothing of what it costs the shop is in here. */
export interface QuotePaper {
  number: string;
  shopName: string;
  shopAddress: string;
  customerName: string;
  title: string;
  /** YYYY-MM-DD */
  day: string;
  inHandsOn: string | null;
  validUntil: string;
  message: string;
  currency: string;
  outlinePath: string | null;
  breaks: { quantity: number; priceEach: string; goodsTotal: string; total: string }[];
  tooling: { name: string; charge: string }[];
  toolingTotal: string;
}

/** Draws a quote; the same quote always gives the same bytes. */
export function drawQuote(quote: QuotePaper): Promise<Uint8Array> {
  const made = new Date(`${quote.day}T12:00:00Z`);
  const paper = blankPaper(`Quote ${quote.number}`, quote.shopName, made);
  ticketHead(paper, {
    number: quote.number,
    shop: quote.shopName,
    name: quote.customerName,
    about: quote.title,
  });
  stitchAcross(paper, 148);
  drawDays(paper, quote);
  const below = drawPiece(paper, quote.outlinePath);
  const afterPrices = drawPrices(paper, quote, below);
  drawWords(paper, quote, afterPrices);
  return bytesOf(paper);
}

function drawDays(paper: Paper, quote: QuotePaper): void {
  const facts: [string, string][] = [
    ['quoted', printedDay(quote.day)],
    ['good until', printedDay(quote.validUntil)],
    ...(quote.inHandsOn === null
      ? []
      : [['in hands', printedDay(quote.inHandsOn)] as [string, string]]),
  ];
  facts.forEach(([label, value], at) => {
    const x = sheet.left + at * 160;
    paper.font('plain').fontSize(9).fillColor(inkSoft).text(label, x, 162, { lineBreak: false });
    paper.font('strong').fontSize(11).fillColor(ink).text(value, x, 175, { lineBreak: false });
  });
}

/** Draws the outline in a quiet field, as large as fits, and gives the height below it. */
function drawPiece(paper: Paper, path: string | null): number {
  if (path === null) return 210;
  const [width, height, top] = [sheet.right - sheet.left, 130, 204];
  const { halfWidth, halfHeight } = halfSize(path);
  const scale = Math.min((width - 60) / (2 * halfWidth), (height - 24) / (2 * halfHeight), 2.83465);
  paper.save().rect(sheet.left, top, width, height).fill('#F7F4ED').restore();
  paper
    .save()
    .translate(sheet.left + width / 2, top + height / 2)
    .scale(scale);
  paper.path(path).fill(russet).restore();
  return top + height + 18;
}

/** Outlines lie with their middle at the origin, so the farthest point tells the size. */
function halfSize(path: string): { halfWidth: number; halfHeight: number } {
  const ends = [...path.matchAll(/(-?[\d.]+) (-?[\d.]+)(?= [A-Z]|$)/g)];
  const radii = [...path.matchAll(/A (-?[\d.]+) (-?[\d.]+)/g)];
  const reach = (at: 1 | 2) => Math.max(1, ...ends.map((end) => Math.abs(Number(end[at]))));
  const ellipse = radii.length === 2 && ends.every((end) => Number(end[2]) === 0);
  return { halfWidth: reach(1), halfHeight: ellipse ? Number(radii[0]?.[2]) : reach(2) };
}

const columns = [
  { title: 'pieces', x: sheet.left, width: 90 },
  { title: 'each', x: sheet.left + 100, width: 90 },
  { title: 'pieces alone', x: sheet.left + 210, width: 110 },
  { title: 'with tooling', x: sheet.left + 340, width: 143 },
] as const;

function drawPrices(paper: Paper, quote: QuotePaper, top: number): number {
  const tooled = Number(quote.toolingTotal) > 0;
  const shown = columns.slice(0, tooled ? 4 : 3);
  drawRow(
    paper,
    top,
    shown.map((column) => (tooled || column.title !== 'pieces alone' ? column.title : 'total')),
    inkSoft,
  );
  let y = top + 18;
  for (const rung of quote.breaks) {
    const money = [rung.priceEach, rung.goodsTotal, rung.total].map((amount) =>
      printedNumber(amount, 2),
    );
    const cells = [printedNumber(String(rung.quantity), 0), ...money];
    drawRow(paper, y, cells.slice(0, shown.length), ink);
    y += 18;
  }
  stitchAcross(paper, y + 4);
  y += 14;
  for (const tool of quote.tooling) {
    paper
      .font('plain')
      .fontSize(10)
      .fillColor(ink)
      .text(`${tool.name}, charged once`, sheet.left, y, {
        width: 320,
        height: 14,
        ellipsis: true,
      });
    paper.text(printedNumber(tool.charge, 2), sheet.left + 340, y, {
      width: 143,
      align: 'right',
      lineBreak: false,
    });
    y += 16;
  }
  return y + 10;
}

function drawRow(paper: Paper, y: number, cells: string[], colour: string): void {
  cells.forEach((cell, at) => {
    const column = columns[at];
    if (column === undefined) return;
    paper
      .font(at === 0 && colour === ink ? 'strong' : 'plain')
      .fontSize(10)
      .fillColor(colour);
    paper.text(cell, column.x, y, { width: column.width, align: 'right', lineBreak: false });
  });
}

function drawWords(paper: Paper, quote: QuotePaper, top: number): void {
  const width = sheet.right - sheet.left;
  paper.font('plain').fontSize(10).fillColor(inkSoft);
  paper.text(
    `Prices in ${quote.currency}. Sales tax, where it applies, is added on the invoice.`,
    sheet.left,
    top,
    { width },
  );
  if (quote.message !== '') paper.moveDown().fillColor(ink).text(quote.message, { width });
  const from = [quote.shopName, quote.shopAddress].filter((part) => part !== '').join('\n');
  paper.moveDown(2).fillColor(inkSoft).text(from, { width });
}
