import type { EntityManager } from '@mikro-orm/sqlite';
import type { OrderToInvoice, OwedInvoice } from '@hidewright/contract';
import { customerName, moneyOf } from './read-rows.ts';

/** Orders whose goods are ready and which no invoice asks for. */
export async function listUninvoiced(em: EntityManager): Promise<OrderToInvoice[]> {
  const rows = await em.execute<
    {
      id: number;
      number: string;
      customer: string;
      title: string;
      quantity: number;
      total: number;
      state: string;
      shipped_on: string | null;
    }[]
  >(`SELECT customer_order.id, customer_order.number, customer.name AS customer, customer_order.title,
      customer_order.quantity, customer_order.total, customer_order.state, customer_order.shipped_on
    FROM customer_order JOIN customer ON customer.id = customer_order.customer_id
    WHERE customer_order.state IN ('packed', 'part shipped', 'shipped') AND customer_order.total > 0
      AND NOT EXISTS (SELECT 1 FROM invoice WHERE invoice.order_id = customer_order.id AND invoice.state <> 'credited')
    ORDER BY customer_order.id`);
  return rows.map((row) => ({
    orderId: row.id,
    orderNumber: row.number,
    customerName: row.customer,
    title: row.title,
    quantity: row.quantity,
    total: moneyOf(row.total),
    state: row.state,
    shippedOn: row.shipped_on,
  }));
}

/** Issued invoices that are not paid in full, longest due first; how late they are is worked out by who asks. */
export async function listOpen(
  em: EntityManager,
): Promise<Omit<OwedInvoice, 'band' | 'daysLate'>[]> {
  const rows = await em.execute<
    {
      id: number;
      number: string;
      customer: string;
      issued_on: string;
      due_on: string;
      total: number;
      open: number;
    }[]
  >(`SELECT invoice.id, invoice.number, ${customerName} AS customer, invoice.issued_on, invoice.due_on,
      invoice.total, invoice.total - invoice.paid - invoice.credited AS open
    FROM invoice JOIN customer ON customer.id = invoice.customer_id
    WHERE invoice.number IS NOT NULL AND invoice.total > invoice.paid + invoice.credited
    ORDER BY invoice.due_on, invoice.sequence`);
  return rows.map((row) => ({
    invoiceId: row.id,
    number: row.number,
    customerName: row.customer,
    issuedOn: row.issued_on,
    dueOn: row.due_on,
    total: moneyOf(row.total),
    open: moneyOf(row.open),
  }));
}
