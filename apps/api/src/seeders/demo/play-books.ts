import { Decimal } from 'decimal.js';
import { draftInvoice } from '../../flows/draft-invoice.ts';
import { issueInvoice } from '../../flows/issue-invoice.ts';
import { lockPeriod } from '../../flows/lock-period.ts';
import { recordPayment } from '../../flows/record-payment.ts';
import { shipOrder } from '../../flows/ship-order.ts';
import { Invoice } from '../../modules/invoices/invoice.entity.ts';
import { addDays, addWorkdays } from '@hidewright/domain';
import { moneyText } from '../../http/decimal-text.ts';
import { reaches, type Played, type Stage } from './stage.ts';
import type { DemoShop } from './demo-shop.ts';
import type { Year } from './year.ts';

/** Shipped the day after it was packed, invoiced the same afternoon, paid after a while. */
export function planBooks({ shop, year, furnished }: Stage, played: Played): void {
  const { run } = played;
  const shipped = addWorkdays(year.day(run.daysBefore), 11);
  year.planOn(shipped, '13:30', async () => {
    await shop.as('owner', (work) => shipOrder(work, played.orderId, work.today));
  });
  if (!reaches(run, 'invoiced')) return;
  year.planOn(shipped, '16:10', () =>
    shop.as('bookkeeper', async (work) => {
      const { id } = await draftInvoice(work, {
        orderId: played.orderId,
        taxRateId: furnished.taxRateId,
      });
      await issueInvoice(work, { invoiceId: id, issuedOn: work.today });
    }),
  );
  if (!reaches(run, 'part paid')) return;
  year.planOn(addWorkdays(addDays(shipped, (run.paidAfter ?? 20) - 1), 1), '10:20', () =>
    pay(shop, played),
  );
}

function pay(shop: DemoShop, { run, orderId }: Played): Promise<void> {
  return shop.as('bookkeeper', async (work) => {
    const invoice = await work.em.findOneOrFail(Invoice, { orderId });
    const share = run.fate === 'part paid' ? '0.5' : '1';
    const amount = moneyText(invoice.total.times(share).toDecimalPlaces(2, Decimal.ROUND_HALF_UP));
    await recordPayment(work, {
      invoiceId: invoice.id,
      amount,
      receivedOn: work.today,
      method: run.method ?? 'bank',
      note: '',
    });
  });
}

/** Each month is locked in the week after it ends; the last full one still waits for the bookkeeper. */
export function planLocks(shop: DemoShop, year: Year): void {
  const waiting = firstOfMonth(addDays(firstOfMonth(year.end), -1));
  for (
    let fromDay = firstOfMonth(year.day(365));
    fromDay < waiting;
    fromDay = firstOfMonth(addDays(fromDay, 32))
  ) {
    const toDay = addDays(firstOfMonth(addDays(fromDay, 32)), -1);
    year.planOn(addDays(toDay, 5), '17:00', async () => {
      await shop.as('bookkeeper', (work) => lockPeriod(work, { fromDay, toDay }));
    });
  }
}

const firstOfMonth = (day: string) => `${day.slice(0, 7)}-01`;
