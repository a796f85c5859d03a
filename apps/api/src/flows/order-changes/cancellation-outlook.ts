import type { CancellationOutlook } from '@hidewright/contract';
import { createHash } from 'node:crypto';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Customer } from '../../modules/customers/customer.entity.ts';
import type { Job } from '../../modules/jobs/job.entity.ts';
import type { Order } from '../../modules/orders/order.entity.ts';
import { arrivalWords } from '../../modules/orders/order-states.ts';
import { PatternVersion } from '../../modules/patterns/pattern-version.entity.ts';
import { Quote } from '../../modules/quotes/quote.entity.ts';
import { describeItem } from '../../modules/stock/described-item.ts';
import type { StockItem } from '../../modules/stock/stock-item.ts';
import type { Work } from '../../work.ts';
import { openJobs } from '../bench-load.ts';
import { toolsFor } from '../choose-tools.ts';
import { whyNotCancelled } from './why-not-cancelled.ts';
import { whyNotTold } from './tell-customer.ts';

/** What cancelling an order would do to the shelf, the bench, and what is on its way. */
export async function cancellationOutlook(
  work: Work,
  { order, job }: { order: Order; job: Job },
  mailAvailable: boolean,
): Promise<CancellationOutlook> {
  const { em } = work;
  const customer = await em.findOneOrFail(Customer, order.customerId);
  const outlook = {
    because: (await whyNotCancelled(em, order))?.because ?? null,
    held: await sayEach(work, await heldBy(work, job.id)),
    taken: await sayEach(work, await takenFor(work, job.id)),
    benchMinutes: await minutesHeld(work, job.id),
    packed: job.state === 'finished' ? Math.min(job.good, order.quantity) : 0,
    purchaseOrders: await draftedFor(work, order),
    tools: await toolsToCome(work, order, job),
    depositReceived: await depositReceived(work, order.id),
    cannotMail: whyNotTold(customer, mailAvailable),
  };
  return { ...outlook, seen: digestOf(order, job, outlook) };
}

/** Changes with everything that whoever cancels should have seen. */
const digestOf = (order: Order, job: Job, outlook: object): string =>
  createHash('sha256')
    .update(JSON.stringify([order.state, job.state, outlook]))
    .digest('hex')
    .slice(0, 32);

interface Amount {
  lot_id: number | null;
  hardware_id: number | null;
  quantity: number;
}

const heldBy = ({ em }: Work, jobId: number): Promise<Amount[]> =>
  em.execute(
    `SELECT lot_id, hardware_id, SUM(open) AS quantity FROM reservation WHERE job_id = ? AND open > 0
     GROUP BY lot_id, hardware_id ORDER BY hardware_id, lot_id`,
    [jobId],
  );

/** An offcut came out of what was taken of the lot that it was cut from. */
const takenFor = ({ em }: Work, jobId: number): Promise<Amount[]> =>
  em.execute(
    `SELECT COALESCE(from_lot_id, lot_id) AS lot_id, hardware_id, -SUM(quantity) AS quantity
     FROM stock_movement WHERE job_id = ? GROUP BY COALESCE(from_lot_id, lot_id), hardware_id
     HAVING SUM(quantity) < 0 ORDER BY hardware_id, COALESCE(from_lot_id, lot_id)`,
    [jobId],
  );

async function sayEach({ em }: Work, amounts: readonly Amount[]): Promise<string[]> {
  const said: string[] = [];
  for (const amount of amounts) {
    const item: StockItem =
      amount.lot_id === null
        ? { hardwareId: amount.hardware_id as number }
        : { lotId: amount.lot_id };
    const { name, say } = await describeItem(em, item);
    said.push(`${say(amount.quantity)} of ${name}`);
  }
  return said;
}

async function minutesHeld({ em }: Work, jobId: number): Promise<string> {
  const held = (await openJobs(em)).find((job) => job.jobId === jobId);
  return unscaled(held?.remaining ?? 0, 2).toString();
}

/** What was drafted from the check keeps which quotes it is for. */
async function draftedFor(
  { em }: Work,
  order: Order,
): Promise<CancellationOutlook['purchaseOrders']> {
  const { number } = await em.findOneOrFail(Quote, order.quoteId);
  return em.execute(
    `SELECT p.id, p.number, s.name AS supplierName, p.state FROM purchase_order p
       JOIN supplier s ON s.id = p.supplier_id
     WHERE p.state IN ('draft', 'sent', 'part received') AND instr(p.drafted_for, ? || ',') > 0 ORDER BY p.id`,
    [number],
  );
}

async function toolsToCome({ em }: Work, order: Order, job: Job): Promise<string[]> {
  const { patternId } = await em.findOneOrFail(PatternVersion, job.patternVersionId);
  const plates = await toolsFor(em, 'stamp plate', { patternId, customerId: order.customerId });
  return plates
    .filter(({ state, customerId }) => state === 'on order' && customerId === order.customerId)
    .map(({ kind, number }) => `${kind} ${number}`);
}

async function depositReceived({ em }: Work, orderId: number): Promise<boolean> {
  const rows = await em.execute<unknown[]>(
    `SELECT 1 FROM activity WHERE subject_kind = 'order' AND subject_id = ? AND action LIKE ? LIMIT 1`,
    [orderId, `noted for %: ${arrivalWords('deposit')}`],
  );
  return rows.length > 0;
}
