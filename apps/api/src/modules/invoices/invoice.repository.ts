import type { EntityManager } from '@mikro-orm/sqlite';
import type { InvoiceState, InvoiceSummary, listInvoices, QueryOf } from '@hidewright/contract';
import { when } from '../../db/sql-conditions.ts';
import { customerName, matching, moneyOf, type AskedPage } from './read-rows.ts';
import { soldFromShelf } from './whose-draft.ts';

interface SummaryRow {
  id: number;
  number: string | null;
  state: InvoiceState;
  customer_id: number;
  customer_name: string;
  order_id: number | null;
  order_number: string | null;
  title: string;
  issued_on: string | null;
  due_on: string | null;
  net: number;
  tax: number;
  total: number;
  paid: number;
  open: number;
  version: number;
}

const title = `coalesce(customer_order.title, '${soldFromShelf}')`;

const summarySql = (
  where: string,
) => `SELECT invoice.id, invoice.number, invoice.state, invoice.customer_id,
    ${customerName} AS customer_name, invoice.order_id, customer_order.number AS order_number, ${title} AS title,
    invoice.issued_on, invoice.due_on, invoice.net, invoice.tax, invoice.total, invoice.paid,
    invoice.total - invoice.paid - invoice.credited AS open, invoice.version
  FROM invoice JOIN customer ON customer.id = invoice.customer_id
    LEFT JOIN customer_order ON customer_order.id = invoice.order_id
  WHERE ${where}`;

type Wanted = Partial<Pick<QueryOf<typeof listInvoices>, 'state' | 'customerId' | 'of'>>;

/** One row more than asked for, so that a further page shows. */
export async function listSummaries(
  em: EntityManager,
  today: string,
  asked: AskedPage & Wanted,
): Promise<InvoiceSummary[]> {
  const words = `coalesce(invoice.number, ''), ${customerName}, customer_order.number, ${title}`;
  const { where, params } = matching('invoice.id', words, asked);
  const wanted = [
    ...when(asked.state, 'invoice.state = ?'),
    ...when(asked.customerId, 'invoice.customer_id = ?'),
    ...when(asked.of, '(invoice.order_id IS NULL) = ?', (of) => [of === 'shelf' ? 1 : 0]),
  ];
  const conditions = [...where, ...wanted.map(({ sql }) => sql)].join(' AND ');
  const rows = await em.execute<SummaryRow[]>(
    `${summarySql(conditions)} ORDER BY invoice.id DESC LIMIT ?`,
    [...params, ...wanted.flatMap(({ values }) => values), asked.limit + 1],
  );
  return rows.map((row) => toSummary(row, today));
}

export async function readSummary(
  em: EntityManager,
  today: string,
  id: number,
): Promise<InvoiceSummary | undefined> {
  const [row] = await em.execute<SummaryRow[]>(summarySql('invoice.id = ?'), [id]);
  return row === undefined ? undefined : toSummary(row, today);
}

const toSummary = (row: SummaryRow, today: string): InvoiceSummary => ({
  id: row.id,
  number: row.number,
  state: row.state,
  customerId: row.customer_id,
  customerName: row.customer_name,
  orderId: row.order_id,
  orderNumber: row.order_number,
  title: row.title,
  issuedOn: row.issued_on,
  dueOn: row.due_on,
  net: moneyOf(row.net),
  tax: moneyOf(row.tax),
  total: moneyOf(row.total),
  paid: moneyOf(row.paid),
  open: moneyOf(row.open),
  overdue: row.due_on !== null && row.due_on < today && row.open > 0,
  version: row.version,
});
