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
import { printedDay } from './paper-text.ts';
import { drawPrices, type QuotePrices } from './quote-prices.ts';

/** A quote as the customer gets it: nothing of what it costs the shop is in here. */
export interface QuotePaper extends QuotePrices {
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
