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

interface PrintedLine {
  position: number;
  description: string;
  quantity: number;
  unitPrice: string;
  amount: string;
  /** Null where no tax applies. */
  taxPercent: string | null;
  taxName: string | null;
}

/** Everything that an issued invoice says: what is printed, hashed and kept. */
export interface InvoiceSnapshot {
  number: string;
  issuedOn: string;
  dueOn: string;
  /** Null for pieces that were sold from the shelf. */
  orderNumber: string | null;
  title: string;
  currency: string;
  digits: number;
  workshop: { name: string; address: string; taxNumber: string };
  billedTo: { name: string; contactName: string; address: string };
  lines: PrintedLine[];
  taxes: { percent: string; net: string; tax: string }[];
  net: string;
  tax: string;
  total: string;
}

const width = sheet.right - sheet.left;
const firstLine = 160;
const columns = [
  { name: 'description', title: 'for', at: 0, width: 232 },
  { name: 'quantity', title: 'quantity', at: 236, width: 52 },
  { name: 'unitPrice', title: 'each', at: 294, width: 68 },
  { name: 'tax', title: 'tax', at: 366, width: 40 },
  { name: 'amount', title: 'amount', at: 408, width: 75 },
] as const;
type Cells = Record<(typeof columns)[number]['name'], string>;

/** Draws an issued invoice; the same snapshot always gives the same bytes. */
export function drawInvoice(invoice: InvoiceSnapshot): Promise<Uint8Array> {
  const made = new Date(`${invoice.issuedOn}T12:00:00Z`);
  const paper = blankPaper(`Invoice ${invoice.number}`, invoice.workshop.name, made);
  const { workshop, billedTo } = invoice;
  ticketHead(paper, {
    number: `Invoice ${invoice.number}`,
    shop: workshop.name,
    name: billedTo.name,
    about: invoice.title,
  });
  const below = Math.max(drawParties(paper, invoice), drawFacts(paper, invoice));
  drawTotals(
    paper,
    invoice,
    drawTable(
      paper,
      columns,
      invoice.lines.map((line) => cellsOf(line, invoice.digits)),
      below + 20,
    ),
  );
  return bytesOf(paper);
}

function drawParties(paper: Paper, { workshop, billedTo }: InvoiceSnapshot): number {
  const afterCustomer = party(
    paper,
    'to',
    [billedTo.name, billedTo.contactName, billedTo.address],
    sheet.left,
  );
  const shop = [
    workshop.name,
    workshop.address,
    workshop.taxNumber && `Tax number ${workshop.taxNumber}`,
  ];
  return Math.max(afterCustomer, party(paper, 'from', shop, sheet.left + 170));
}

function party(paper: Paper, label: string, words: string[], x: number): number {
  paper.font('plain').fontSize(9).fillColor(inkSoft).text(label, x, firstLine, { width: 156 });
  paper.fontSize(10).fillColor(ink);
  for (const word of words) if (word !== '') paper.text(word, { width: 156 });
  return paper.y;
}

function drawFacts(paper: Paper, invoice: InvoiceSnapshot): number {
  const facts: [string, string][] = [
    ['issued', printedDay(invoice.issuedOn)],
    ['due', printedDay(invoice.dueOn)],
    ...(invoice.orderNumber === null ? [] : [['order', invoice.orderNumber] as [string, string]]),
  ];
  facts.forEach(([label, value], at) => {
    const y = firstLine + at * 30;
    paper
      .font('plain')
      .fontSize(9)
      .fillColor(inkSoft)
      .text(label, sheet.left + 350, y);
    paper
      .font('strong')
      .fontSize(11)
      .fillColor(ink)
      .text(value, sheet.left + 350, y + 12, { width: width - 350 });
  });
  return paper.y;
}

function cellsOf(line: PrintedLine, digits: number): Cells {
  return {
    description: line.description,
    quantity: printedNumber(String(line.quantity), 0),
    unitPrice: printedNumber(line.unitPrice, digits),
    tax: line.taxPercent === null ? '–' : `${line.taxPercent} %`,
    amount: printedNumber(line.amount, digits),
  };
}

function drawTotals(paper: Paper, invoice: InvoiceSnapshot, top: number): void {
  const needed = (invoice.taxes.length + 3) * 20;
  let y = top;
  if (y + needed > sheet.bottom) {
    paper.addPage();
    y = sheet.top;
  }
  stitchAcross(paper, y + 2);
  y = drawSum(paper, y + 12, 'net', printedNumber(invoice.net, invoice.digits));
  for (const { percent, net, tax } of invoice.taxes) {
    const label = `${taxName(invoice, percent)} ${percent} % on ${printedNumber(net, invoice.digits)}`;
    y = drawSum(paper, y, label, printedNumber(tax, invoice.digits));
  }
  if (invoice.taxes.length === 0)
    y = drawSum(paper, y, 'no tax', printedNumber('0', invoice.digits));
  const payable = `${printedNumber(invoice.total, invoice.digits)} ${invoice.currency}`;
  paper.font('strong').fontSize(13).fillColor(ink);
  drawSum(paper, y + 4, `to pay by ${printedDay(invoice.dueOn)}`, payable, 150);
}

/** What the tax at a rate is called, where all its lines agree. */
function taxName(invoice: InvoiceSnapshot, percent: string): string {
  const taxed = invoice.lines.filter((line) => line.taxPercent === percent);
  const [name, ...others] = new Set(taxed.map((line) => line.taxName ?? 'tax'));
  return name === undefined || others.length > 0 ? 'tax' : name;
}

function drawSum(paper: Paper, y: number, label: string, amount: string, room = 100): number {
  paper.text(label, sheet.left, y, { width: width - room, align: 'right' });
  const below = paper.y;
  paper.text(amount, sheet.right - room, y, { width: room, align: 'right' });
  return Math.max(below, paper.y) + 4;
}
