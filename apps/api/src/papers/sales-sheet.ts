import { PassThrough } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import ExcelJS from 'exceljs';
import type { SalesSheet } from '@hidewright/contract';

/** How a column is typed: text stays text whatever it begins with, numbers and days are real ones. */
type Kind = 'text' | 'count' | 'money' | 'price' | 'percent' | 'day';

interface Column {
  title: string;
  width: number;
  kind: Kind;
}

type Cell = string | number | null;

const formats: Record<Kind, string> = {
  text: '@',
  count: '#,##0',
  money: '#,##0.00',
  price: '#,##0.00##',
  percent: '0.####',
  day: 'yyyy-mm-dd',
};

const column = (title: string, kind: Kind, width = 14): Column => ({ title, kind, width });

/** Writes the bookkeeper's workbook of a period: each sheet has one head row, then rows alone. */
export async function drawSalesSheet(sheet: SalesSheet): Promise<Uint8Array> {
  const out = new PassThrough();
  const bytes = buffer(out);
  const book = new ExcelJS.stream.xlsx.WorkbookWriter({
    stream: out,
    useStyles: true,
    useSharedStrings: true,
  });
  book.creator = sheet.workshopName;
  writeInvoices(book, sheet);
  writeLines(book, sheet);
  writeTaxes(book, sheet);
  writePayments(book, sheet);
  writeTotals(book, sheet);
  await book.commit();
  return bytes;
}

type Book = ExcelJS.stream.xlsx.WorkbookWriter;

function writeInvoices(book: Book, { invoices }: SalesSheet): void {
  const columns = [
    column('Invoice', 'text'),
    column('Issued', 'day'),
    column('Due', 'day'),
    column('Customer', 'text', 32),
    column('Order', 'text'),
    column('Net', 'money'),
    column('Tax', 'money'),
    column('Total', 'money'),
  ];
  const rows = invoices.map((row) => [
    row.number,
    row.issuedOn,
    row.dueOn,
    row.customerName,
    row.orderNumber,
    row.net,
    row.tax,
    row.total,
  ]);
  write(book, 'Invoices', columns, rows);
}

function writeLines(book: Book, { lines }: SalesSheet): void {
  const columns = [
    column('Invoice', 'text'),
    column('Issued', 'day'),
    column('Line', 'count', 8),
    column('For', 'text', 44),
    column('Quantity', 'count'),
    column('Each', 'price'),
    column('Net', 'money'),
    column('Tax %', 'percent', 10),
  ];
  const rows = lines.map((row) => [
    row.invoiceNumber,
    row.issuedOn,
    row.position,
    row.description,
    row.quantity,
    row.unitPrice,
    row.amount,
    row.taxPercent,
  ]);
  write(book, 'Lines', columns, rows);
}

/** A row without a percentage is what no tax applies to. */
function writeTaxes(book: Book, { totals }: SalesSheet): void {
  const columns = [
    column('Tax %', 'percent', 10),
    column('Note', 'text', 20),
    column('Net', 'money'),
    column('Tax', 'money'),
  ];
  const rows = totals.taxes.map((row) => [
    row.percent,
    row.percent === null ? 'No tax' : '',
    row.net,
    row.tax,
  ]);
  write(book, 'Tax by rate', columns, rows);
}

function writePayments(book: Book, { payments }: SalesSheet): void {
  const columns = [
    column('Received', 'day'),
    column('Invoice', 'text'),
    column('Customer', 'text', 32),
    column('How', 'text'),
    column('Note', 'text', 32),
    column('Amount', 'money'),
  ];
  const rows = payments.map((row) => [
    row.receivedOn,
    row.invoiceNumber,
    row.customerName,
    row.method,
    row.note,
    row.amount,
  ]);
  write(book, 'Payments', columns, rows);
}

function writeTotals(book: Book, { totals, fromDay, toDay, currency }: SalesSheet): void {
  const columns = [
    column('From', 'day'),
    column('To', 'day'),
    column('Currency', 'text', 10),
    column('Invoices', 'count', 10),
    column('Net', 'money'),
    column('Tax', 'money'),
    column('Total', 'money'),
    column('Payments', 'count', 10),
    column('Received', 'money'),
  ];
  const { invoices, net, tax, total, payments, received } = totals;
  write(book, 'Totals', columns, [
    [fromDay, toDay, currency, invoices, net, tax, total, payments, received],
  ]);
}

function write(book: Book, name: string, columns: Column[], rows: Cell[][]): void {
  const page = book.addWorksheet(name, { views: [{ state: 'frozen', ySplit: 1 }] });
  page.columns = columns.map(({ title, width, kind }) => ({
    header: title,
    width,
    style: { numFmt: formats[kind] },
  }));
  page.getRow(1).font = { bold: true };
  page.getRow(1).commit();
  for (const cells of rows) {
    page.addRow(cells.map((cell, at) => typed(cell, columns[at]?.kind ?? 'text'))).commit();
  }
  page.commit();
}

function typed(cell: Cell, kind: Kind): ExcelJS.CellValue {
  if (cell === null || cell === '') return null;
  if (kind === 'text') return String(cell);
  if (kind === 'day') return new Date(`${cell}T00:00:00Z`);
  return Number(cell);
}
