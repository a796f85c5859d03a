import { Decimal } from 'decimal.js';
import type { PaymentMethod } from '@hidewright/contract';
import { parseMoney } from '@hidewright/domain';
import { moneyText } from '../http/decimal-text.ts';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findInvoice } from '../modules/invoices/find-invoice.ts';
import type { Invoice } from '../modules/invoices/invoice.entity.ts';
import { currencyDigits } from '../modules/invoices/sum-up.ts';
import { Payment } from '../modules/payments/payment.entity.ts';
import { postEntry } from '../modules/periods/ledger.ts';
import { requireOpenDay } from '../modules/periods/open-days.ts';
import type { Work } from '../work.ts';
import { closeIfSettled } from './close-order.ts';

interface Received {
  invoiceId: number;
  amount: string;
  receivedOn: string;
  method: PaymentMethod;
  note: string;
}

/**
 * Records money that came in for an issued invoice, as a row that stays; a paid and shipped order is closed.
 * @throws {Problem} 409 for a draft, a paid invoice or a locked day; 422 for an amount of nought or above what is open
 */
export async function recordPayment(work: Work, received: Received): Promise<Invoice> {
  const invoice = await findInvoice(work.em, received.invoiceId);
  requirePayable(invoice);
  const amount = await readAmount(work, invoice, received.amount);
  await requireOpenDay(work, received.receivedOn, 'receivedOn');
  const payment = work.em.create(Payment, {
    invoiceId: invoice.id,
    amount,
    receivedOn: received.receivedOn,
    method: received.method,
    note: received.note,
    at: work.now.toISOString(),
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  invoice.paid = invoice.paid.plus(amount);
  invoice.state = openOf(invoice).isZero() ? 'paid' : 'part paid';
  await work.em.flush();
  await post(work, payment);
  await logDeed(work, {
    action: `recorded ${moneyText(amount)} received for ${String(invoice.number)}`,
    subjectKind: 'invoice',
    subjectId: invoice.id,
    detail: { amount: moneyText(amount), receivedOn: payment.receivedOn, state: invoice.state },
  });
  if (invoice.orderId !== null) await closeIfSettled(work, invoice.orderId);
  return invoice;
}

const openOf = (invoice: Invoice) => invoice.total.minus(invoice.paid).minus(invoice.credited);

function requirePayable(invoice: Invoice): void {
  if (invoice.state === 'draft') {
    throw wrongState('This invoice is a draft. Issue it before you record a payment.', [
      'issue it',
    ]);
  }
  if (openOf(invoice).isZero()) {
    throw wrongState(`${String(invoice.number)} is ${invoice.state}: nothing is open on it.`, [
      'download it',
    ]);
  }
}

async function readAmount(work: Work, invoice: Invoice, typed: string): Promise<Decimal> {
  const amount = new Decimal(parseMoney(typed, await currencyDigits(work)));
  if (amount.isZero()) throw invalid([{ field: 'amount', message: 'Enter an amount above zero.' }]);
  const open = openOf(invoice);
  if (amount.greaterThan(open)) {
    const message = `Only ${moneyText(open)} is open on ${String(invoice.number)}. Enter that or less.`;
    throw invalid([{ field: 'amount', message }]);
  }
  return amount;
}

async function post(work: Work, payment: Payment): Promise<void> {
  await postEntry(work, {
    day: payment.receivedOn,
    invoiceId: payment.invoiceId,
    paymentId: payment.id,
    sides: [
      ['money', payment.amount],
      ['receivables', payment.amount.negated()],
    ],
  });
}
