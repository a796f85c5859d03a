import {
  blankPaper,
  bytesOf,
  ink,
  inkSoft,
  sheet,
  stitchAcross,
  ticketHead,
  type Paper,
} from './paper.ts';
import { drawTable } from './paper-table.ts';
import { printedDay, printedNumber } from './paper-text.ts';
import { drawQrCode } from './qr-code.ts';

/** An order to a supplier, as the supplier gets it. */
export interface PurchaseOrderPaper {
  number: string;
  shopName: string;
  shopAddress: string;
  supplierName: string;
  /** YYYY-MM-DD */
  day: string;
  expectedOn: string | null;
  currency: string;
  digits: number;
  lines: {
    name: string;
    /** What the supplier calls it; empty where nobody said. */
    articleNumber: string;
    /** With its unit: "40 ft²", "1,000"; "5 sides, about 110 ft²". */
    quantity: string;
    /** Null where it is not known: the supplier is asked for it. */
    unitPrice: string | null;
    /** "per ft²", "each" or "for the lot" */
    per: string;
    amount: string;
  }[];
  /** No goods are asked for. */
  onlyWork: boolean;
  total: string;
  note: string;
}

const width = sheet.right - sheet.left;
const codeSize = 72;
const columns = [
  { name: 'what', title: 'what', at: 0, width: 210 },
  { name: 'quantity', title: 'how much', at: 214, width: 84 },
  { name: 'price', title: 'price', at: 302, width: 100 },
  { name: 'amount', title: 'amount', at: 406, width: 77 },
] as const;
type Cells = Record<(typeof columns)[number]['name'], string>;

/** Draws an order to a supplier; the same order always gives the same bytes. */
export function drawPurchaseOrder(order: PurchaseOrderPaper): Promise<Uint8Array> {
  const made = new Date(`${order.day}T12:00:00Z`);
  const paper = blankPaper(`Order ${order.number}`, order.shopName, made);
  ticketHead(paper, {
    number: `Order ${order.number}`,
    shop: order.shopName,
    name: order.supplierName,
    about: order.onlyWork
      ? 'Please do the work that stands below.'
      : 'Please send us what stands below.',
  });
  const below = Math.max(drawFacts(paper, order), drawCode(paper, order));
  drawWords(
    paper,
    order,
    drawTotal(
      paper,
      order,
      drawTable(
        paper,
        columns,
        order.lines.map((line) => cellsOf(line, order.digits)),
        below + 20,
      ),
    ),
  );
  return bytesOf(paper);
}

function drawFacts(paper: Paper, order: PurchaseOrderPaper): number {
  const facts: [string, string][] = [
    ['ordered', printedDay(order.day)],
    ...(order.expectedOn === null
      ? []
      : [['wanted by', printedDay(order.expectedOn)] as [string, string]]),
    ['send it to', addressOf(order)],
  ];
  let y = 152;
  for (const [label, value] of facts) {
    paper
      .font('plain')
      .fontSize(9)
      .fillColor(inkSoft)
      .text(label, sheet.left, y + 2);
    paper
      .fontSize(11)
      .fillColor(ink)
      .text(value, sheet.left + 76, y, { width: 260 });
    y = paper.y + 6;
  }
  return y;
}

/** Many an address begins with the shop's name already. */
const addressOf = ({ shopName, shopAddress }: PurchaseOrderPaper): string =>
  shopAddress.startsWith(shopName) ? shopAddress : [shopName, shopAddress].join('\n');

/** The order's number to be scanned, for the slip that comes with the goods. */
function drawCode(paper: Paper, { number }: PurchaseOrderPaper): number {
  const [x, y] = [sheet.right - codeSize, 152];
  drawQrCode(paper, number, { x, y, size: codeSize });
  paper.font('plain').fontSize(8).fillColor(inkSoft);
  paper.text(
    'Please put this sheet, or this number, in with the goods.',
    x - 40,
    y + codeSize + 6,
    {
      width: codeSize + 40,
      align: 'right',
    },
  );
  return paper.y;
}

function cellsOf(line: PurchaseOrderPaper['lines'][number], digits: number): Cells {
  return {
    what: [line.name, line.articleNumber && `your article ${line.articleNumber}`]
      .filter(Boolean)
      .join('\n'),
    quantity: line.quantity,
    ...(line.unitPrice === null
      ? { price: 'please tell us', amount: '' }
      : {
          price: `${printedNumber(line.unitPrice, digits)} ${line.per}`,
          amount: printedNumber(line.amount, digits),
        }),
  };
}

function drawTotal(paper: Paper, order: PurchaseOrderPaper, top: number): number {
  let y = top;
  if (y + 40 > sheet.bottom) {
    paper.addPage();
    y = sheet.top;
  }
  stitchAcross(paper, y + 2);
  paper.font('strong').fontSize(12).fillColor(ink);
  const total = `${printedNumber(order.total, order.digits)} ${order.currency}`;
  paper.text('together, before carriage and tax', sheet.left, y + 12, {
    width: width - 130,
    align: 'right',
  });
  paper.text(total, sheet.right - 130, y + 12, { width: 130, align: 'right' });
  return paper.y + 14;
}

function drawWords(paper: Paper, { note }: PurchaseOrderPaper, top: number): void {
  if (note === '') return;
  paper.font('plain').fontSize(10).fillColor(ink).text(note, sheet.left, top, { width });
}
