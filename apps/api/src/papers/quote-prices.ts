import { ink, inkSoft, sheet, stitchAcross, type Paper } from './paper.ts';
import { printedNumber } from './paper-text.ts';

interface PricedRung {
  quantity: number;
  priceEach: string;
  goodsTotal: string;
  charges: { name: string; amount: string }[];
  total: string;
  reorderTotal: string;
}

/** What is asked at each quantity, and once beside it. */
export interface QuotePrices {
  breaks: PricedRung[];
  options: { name: string; breaks: PricedRung[] }[];
  tooling: { name: string; charge: string }[];
  toolingTotal: string;
  resalePrice: string | null;
}

const columns = [
  { title: 'pieces', x: sheet.left, width: 70 },
  { title: 'each', x: sheet.left + 80, width: 80 },
  { title: 'pieces alone', x: sheet.left + 170, width: 100 },
  { title: 'in all', x: sheet.left + 280, width: 100 },
  { title: 'a later order', x: sheet.left + 390, width: 93 },
] as const;

/** Draws the ladder, that of every option, and what is charged once; gives the height below it. */
export function drawPrices(paper: Paper, prices: QuotePrices, top: number): number {
  let y = drawLadder(paper, prices, prices.breaks, top);
  for (const option of prices.options) {
    y = onPage(paper, y + 10, 60);
    paper.font('strong').fontSize(11).fillColor(ink).text(option.name, sheet.left, y);
    y = drawLadder(paper, prices, option.breaks, y + 18);
  }
  stitchAcross(paper, y + 4);
  return drawOnce(paper, prices, y + 14);
}

function drawLadder(
  paper: Paper,
  { toolingTotal }: QuotePrices,
  rungs: PricedRung[],
  top: number,
): number {
  const tooled = Number(toolingTotal) > 0;
  const more = tooled || rungs.some(({ charges }) => charges.length > 0);
  const shown = tooled ? 5 : more ? 4 : 3;
  const titles = columns.map(({ title }) => (!more && title === 'pieces alone' ? 'total' : title));
  drawRow(paper, top, titles.slice(0, shown), inkSoft);
  let y = top + 18;
  for (const rung of rungs) {
    y = onPage(paper, y, 18);
    const { priceEach, goodsTotal, total, reorderTotal } = rung;
    const money = [priceEach, goodsTotal, total, reorderTotal].map((each) =>
      printedNumber(each, 2),
    );
    drawRow(paper, y, [printedNumber(String(rung.quantity), 0), ...money].slice(0, shown), ink);
    y += 18;
  }
  return y;
}

function drawOnce(paper: Paper, prices: QuotePrices, top: number): number {
  const lines: [string, string | null][] = [
    ...prices.tooling.map(({ name, charge }): [string, string] => [
      `${name}, charged once`,
      charge,
    ]),
    ...chargesInWords(prices.breaks),
    ...(prices.resalePrice === null
      ? []
      : [['Sold on at, for each piece', prices.resalePrice] as [string, string]]),
  ];
  let y = top;
  for (const [name, amount] of lines) {
    y = onPage(paper, y, 16);
    const place = { width: 320, height: 14, ellipsis: true };
    paper.font('plain').fontSize(10).fillColor(ink).text(name, sheet.left, y, place);
    if (amount !== null) {
      const [x, width] = [sheet.left + 340, 143];
      paper.text(printedNumber(amount, 2), x, y, { width, align: 'right', lineBreak: false });
    }
    y += 16;
  }
  return y + 10;
}

/** Each charge once: its amount where it is the same at every quantity. */
function chargesInWords(rungs: readonly PricedRung[]): [string, string | null][] {
  const all = rungs.flatMap(({ charges }) => charges);
  const names = [...new Set(all.map(({ name }) => name))];
  return names.map((name) => {
    const amounts = all.filter((each) => each.name === name).map(({ amount }) => amount);
    const same = amounts.length === rungs.length && new Set(amounts).size === 1;
    return same ? [name, amounts[0] ?? null] : [`${name}, by quantity, is in the sum`, null];
  });
}

function drawRow(paper: Paper, y: number, cells: readonly string[], colour: string): void {
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

/** Goes to a new sheet where so much does not fit any more. */
function onPage(paper: Paper, y: number, height: number): number {
  if (y + height <= sheet.bottom) return y;
  paper.addPage();
  return sheet.top;
}
