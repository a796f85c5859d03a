import type { EntityManager } from '@mikro-orm/sqlite';
import type { Payment, PaymentMethod } from '@hidewright/contract';
import { customerName, matching, moneyOf, type AskedPage } from './read-rows.ts';

interface PaymentRow {
  id: number;
  invoice_id: number;
  number: string;
  customer: string;
  amount: number;
  received_on: string;
  method: PaymentMethod;
  note: string;
  actor_name: string;
}

const paymentSql = (where: string) => `SELECT payment.id, payment.invoice_id, invoice.number,
    ${customerName} AS customer, payment.amount, payment.received_on, payment.method, payment.note, payment.actor_name
  FROM payment JOIN invoice ON invoice.id = payment.invoice_id JOIN customer ON customer.id = invoice.customer_id
  WHERE ${where}`;

export async function listPaymentsOf(em: EntityManager, invoiceId: number): Promise<Payment[]> {
  const sql = paymentSql('payment.invoice_id = ? ORDER BY payment.received_on, payment.id');
  return (await em.execute<PaymentRow[]>(sql, [invoiceId])).map(toPayment);
}

/** One row more than asked for, so that a further page shows. */
export async function listAllPayments(em: EntityManager, asked: AskedPage): Promise<Payment[]> {
  const { where, params } = matching(
    'payment.id',
    `invoice.number, ${customerName}, payment.note`,
    asked,
  );
  const sql = `${paymentSql(where.join(' AND '))} ORDER BY payment.id DESC LIMIT ?`;
  return (await em.execute<PaymentRow[]>(sql, [...params, asked.limit + 1])).map(toPayment);
}

const toPayment = (row: PaymentRow): Payment => ({
  id: row.id,
  invoiceId: row.invoice_id,
  invoiceNumber: row.number,
  customerName: row.customer,
  amount: moneyOf(row.amount),
  receivedOn: row.received_on,
  method: row.method,
  note: row.note,
  recordedBy: row.actor_name,
});
