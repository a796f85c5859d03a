import type { SalesSheet } from '@hidewright/contract';
import { column, workbook, writePage, type Book } from './sheet-pages.ts';

/** Writes the bookkeeper's workbook of a period: each sheet has one head row, then rows alone. */
export function drawSalesSheet(sheet: SalesSheet): Promise<Uint8Array> {
  return workbook(sheet.workshopName, (book) => {
    writeInvoices(book, sheet);
    writeLines(book, sheet);
    writeTaxes(book, sheet);
    writePayments(book, sheet);
    writeTotals(book, sheet);
  });
}

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
  writePage(book, 'Invoices', columns, rows);
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
  writePage(book, 'Lines', columns, rows);
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
  writePage(book, 'Tax by rate', columns, rows);
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
  writePage(book, 'Payments', columns, rows);
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
  writePage(book, 'Totals', columns, [
    [fromDay, toDay, currency, invoices, net, tax, total, payments, received],
  ]);
}
