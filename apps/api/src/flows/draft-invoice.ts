import { Decimal } from 'decimal.js';
import { lineAmount } from '@hidewright/domain';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Invoice } from '../modules/invoices/invoice.entity.ts';
import { InvoiceLine } from '../modules/invoices/invoice-line.entity.ts';
import { startDraft } from '../modules/invoices/start-draft.ts';
import { currencyDigits, sumUp } from '../modules/invoices/sum-up.ts';
import { Order } from '../modules/orders/order.entity.ts';
import { chosenTaxRate } from '../modules/tax-rates/find-tax-rate.ts';
import type { TaxRate } from '../modules/tax-rates/tax-rate.entity.ts';
import type { Work } from '../work.ts';

interface Asked {
  orderId: number;
  /** Null says that no tax applies. */
  taxRateId: number | null;
}

const ready: readonly Order['state'][] = ['packed', 'part shipped', 'shipped'];

/**
 * Drafts the invoice of an order: its pieces at the agreed price, and tooling as a line of its own.
 * @throws {Problem} 409 when the order is not packed or shipped, or has an invoice; 422 for a rate that cannot be used
 */
export async function draftInvoice(work: Work, asked: Asked): Promise<Invoice> {
  const order = await work.em.findOne(Order, asked.orderId);
  if (order === null) {
    throw invalid([
      {
        field: 'orderId',
        message: 'There is no such order. Choose one that is packed or shipped.',
      },
    ]);
  }
  await requireInvoiceable(work, order);
  const rate = await chosenTaxRate(work.em, asked.taxRateId);
  const invoice = await startDraft(work, { orderId: order.id, customerId: order.customerId });
  await writeLines(work, invoice, order, rate);
  await sumUp(work, invoice);
  await logDeed(work, {
    action: `drafted the invoice for ${order.number}`,
    subjectKind: 'invoice',
    subjectId: invoice.id,
    detail: { order: order.number, tax: rate?.name ?? 'no tax' },
  });
  return invoice;
}

async function requireInvoiceable(work: Work, order: Order): Promise<void> {
  const existing = await work.em.findOne(Invoice, {
    orderId: order.id,
    state: { $ne: 'credited' },
  });
  if (existing !== null) {
    const which =
      existing.number === null ? 'has a draft invoice' : `was invoiced as ${existing.number}`;
    throw wrongState(`${order.number} ${which} already. Open that one.`, ['open its invoice']);
  }
  if (order.state === 'cancelled')
    throw wrongState(`${order.number} was cancelled, so there is nothing to invoice.`, []);
  if (!ready.includes(order.state)) {
    throw wrongState(
      `${order.number} is ${order.state}. It can be invoiced once it is packed.`,
      [],
    );
  }
  if (order.total.isZero()) {
    throw wrongState(`Nothing is to be paid for ${order.number}, so it needs no invoice.`, []);
  }
}

async function writeLines(
  work: Work,
  invoice: Invoice,
  order: Order,
  rate: TaxRate | null,
): Promise<void> {
  const tax = { taxRateId: rate?.id ?? null, taxPercent: rate?.percent ?? new Decimal(0) };
  const goods = lineAmount(order.quantity, order.priceEach.toFixed(), await currencyDigits(work));
  work.em.create(InvoiceLine, {
    ...tax,
    invoiceId: invoice.id,
    position: 1,
    description: order.title,
    quantity: order.quantity,
    unitPrice: order.priceEach,
    amount: new Decimal(goods),
  });
  const once = [
    ...order.charges.map(({ name, amount }) => ({
      description: name,
      amount: new Decimal(amount),
    })),
    { description: 'Tooling, charged once', amount: order.toolingCharge },
  ].filter(({ amount }) => amount.greaterThan(0));
  once.forEach(({ description, amount }, at) =>
    work.em.create(InvoiceLine, {
      ...tax,
      invoiceId: invoice.id,
      position: at + 2,
      description,
      quantity: 1,
      unitPrice: amount,
      amount,
    }),
  );
  await work.em.flush();
}
