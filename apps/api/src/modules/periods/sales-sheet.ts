import { Decimal } from 'decimal.js';
import type {
  SalesSheet,
  SheetInvoice,
  SheetLine,
  SheetPayment,
  SheetTotals,
} from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText, priceText } from '../../http/decimal-text.ts';

/** Reads rows by SQL, on whichever connection asks; all reads of one sheet must see the same moment. */
export type ReadRows = <Row>(sql: string, params: unknown[]) => Promise<Row[]>;

interface SheetHead {
  fromDay: string;
  toDay: string;
  workshopName: string;
  currency: string;
}

/**
 * The sales of a period: what was issued and what was paid on its days. Names come from what was issued, so that
 * a sheet of a locked period reads the same whatever is renamed later.
 */
export async function readSalesSheet(read: ReadRows, head: SheetHead): Promise<SalesSheet> {
  const days = [head.fromDay, head.toDay];
  const invoices = (await read<InvoiceRow>(invoicesSql, days)).map(toInvoice);
  const lines = (await read<LineRow>(linesSql, days)).map(toLine);
  const payments = (await read<PaymentRow>(paymentsSql, days)).map(toPayment);
  const taxes = (await read<TaxRow>(taxesSql, [...days, ...days])).map(toTax);
  return { ...head, totals: totalsOf(invoices, payments, taxes), invoices, lines, payments };
}

const issued = 'invoice.number IS NOT NULL AND invoice.issued_on BETWEEN ? AND ?';

const invoicesSql = `SELECT number, issued_on, due_on, net, tax, total,
    json_extract(snapshot, '$.billedTo.name') AS customer, json_extract(snapshot, '$.orderNumber') AS order_number
  FROM invoice WHERE ${issued} ORDER BY sequence`;

const linesSql = `SELECT invoice.number, invoice.issued_on, line.position, line.description, line.quantity,
    line.unit_price, line.amount, line.tax_rate_id, line.tax_percent
  FROM invoice_line AS line JOIN invoice ON invoice.id = line.invoice_id
  WHERE ${issued} ORDER BY invoice.sequence, line.position`;

const paymentsSql = `SELECT payment.received_on, invoice.number, payment.method, payment.note, payment.amount,
    json_extract(invoice.snapshot, '$.billedTo.name') AS customer
  FROM payment JOIN invoice ON invoice.id = payment.invoice_id
  WHERE payment.received_on BETWEEN ? AND ? ORDER BY payment.received_on, payment.id`;

const taxesSql = `SELECT NULL AS percent, sum(line.amount) AS net, 0 AS tax
  FROM invoice_line AS line JOIN invoice ON invoice.id = line.invoice_id
  WHERE ${issued} AND line.tax_rate_id IS NULL HAVING count(*) > 0
  UNION ALL
  SELECT part.percent, sum(part.net), sum(part.tax)
  FROM invoice_tax AS part JOIN invoice ON invoice.id = part.invoice_id
  WHERE ${issued} GROUP BY part.percent ORDER BY percent`;

interface InvoiceRow {
  number: string;
  issued_on: string;
  due_on: string;
  net: number;
  tax: number;
  total: number;
  customer: string;
  order_number: string | null;
}

interface LineRow {
  number: string;
  issued_on: string;
  position: number;
  description: string;
  quantity: number;
  unit_price: number;
  amount: number;
  tax_rate_id: number | null;
  tax_percent: number;
}

interface PaymentRow {
  received_on: string;
  number: string;
  customer: string;
  method: string;
  note: string;
  amount: number;
}

interface TaxRow {
  percent: number | null;
  net: number;
  tax: number;
}

const moneyOf = (hundredths: number) => moneyText(unscaled(hundredths, 2));
const percentOf = (scaled: number) => unscaled(scaled, 4).toString();

const toInvoice = (row: InvoiceRow): SheetInvoice => ({
  number: row.number,
  issuedOn: row.issued_on,
  dueOn: row.due_on,
  customerName: row.customer,
  orderNumber: row.order_number,
  net: moneyOf(row.net),
  tax: moneyOf(row.tax),
  total: moneyOf(row.total),
});

const toLine = (row: LineRow): SheetLine => ({
  invoiceNumber: row.number,
  issuedOn: row.issued_on,
  position: row.position,
  description: row.description,
  quantity: row.quantity,
  unitPrice: priceText(unscaled(row.unit_price, 4)),
  amount: moneyOf(row.amount),
  taxPercent: row.tax_rate_id === null ? null : percentOf(row.tax_percent),
});

const toPayment = (row: PaymentRow): SheetPayment => ({
  receivedOn: row.received_on,
  invoiceNumber: row.number,
  customerName: row.customer,
  method: row.method,
  note: row.note,
  amount: moneyOf(row.amount),
});

const toTax = (row: TaxRow): SheetTotals['taxes'][number] => ({
  percent: row.percent === null ? null : percentOf(row.percent),
  net: moneyOf(row.net),
  tax: moneyOf(row.tax),
});

function totalsOf(
  invoices: SheetInvoice[],
  payments: SheetPayment[],
  taxes: SheetTotals['taxes'],
): SheetTotals {
  return {
    invoices: invoices.length,
    net: sum(invoices.map((invoice) => invoice.net)),
    tax: sum(invoices.map((invoice) => invoice.tax)),
    total: sum(invoices.map((invoice) => invoice.total)),
    payments: payments.length,
    received: sum(payments.map((payment) => payment.amount)),
    taxes,
  };
}

const sum = (amounts: string[]) =>
  moneyText(amounts.reduce((total, amount) => total.plus(amount), new Decimal(0)));
