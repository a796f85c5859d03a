import type { PromiseOutlook } from '@hidewright/contract';
import { movedPromise, type Day, type LateWork, type MovedPromise } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Customer } from '../../modules/customers/customer.entity.ts';
import { Job } from '../../modules/jobs/job.entity.ts';
import type { Order } from '../../modules/orders/order.entity.ts';
import { sayDay } from '../../say-day.ts';
import type { Work } from '../../work.ts';
import { benchToday, openJobs, type OpenJob } from '../bench-load.ts';
import { whyNotTold } from './tell-customer.ts';

/** Whether the bench can keep another promised day of an order, and what that does to other promises. */
export async function promiseOutlook(
  work: Work,
  order: Order,
  { by, mailAvailable }: { by: Day; mailAvailable: boolean },
): Promise<PromiseOutlook> {
  const job = await work.em.findOneOrFail(Job, { orderId: order.id });
  const open = await openJobs(work.em);
  const moved = movedPromise(await benchToday(work), open, { jobId: job.id, to: by });
  const customer = await work.em.findOneOrFail(Customer, order.customerId);
  return {
    by,
    kept: moved.short === null,
    sentence:
      job.state === 'finished'
        ? `${job.number} is finished: nothing is left to do at the bench.`
        : [sayKept(by, moved), ...sayAwaited(order)].join(' '),
    earliest: moved.earliest,
    pushed: moved.pushed.map((late) => sayPushed(late, open)),
    cannotMail: whyNotTold(customer, mailAvailable),
  };
}

function sayKept(by: Day, { short, earliest }: MovedPromise): string {
  if (short === null) return `The bench can do it by ${sayDay(by)}.`;
  const from =
    earliest === null
      ? 'Within a year there is no day by which it can.'
      : `It can by ${sayDay(earliest)}.`;
  const why =
    short === 0 ? 'its pieces still lie between two steps then' : `${sayHours(short)} are short`;
  return `The bench cannot do it by ${sayDay(by)}: ${why}. ${from}`;
}

/** The bench can have the hours and not be allowed to begin. */
function sayAwaited({ awaits }: Order): string[] {
  return awaits.length === 0
    ? []
    : [`It can begin once it has what it awaits: ${awaits.join(', ')}.`];
}

function sayPushed({ jobId, short }: LateWork, open: readonly OpenJob[]): string {
  const job = open.find((each) => each.jobId === jobId);
  if (job === undefined) throw new TypeError('Only a job that is open can be pushed');
  const what = short === 0 ? 'it would be late' : `${sayHours(short)} of it would be late`;
  return `${job.number} ${job.title} is promised for ${sayDay(job.promisedOn)}: ${what}.`;
}

/** Hundredths of a minute; rounded up, so that it never says that nothing is short. */
function sayHours(hundredths: number): string {
  const minutes = Math.ceil(hundredths / 100);
  if (minutes < 60) return `${minutes} minutes`;
  return `${unscaled(Math.ceil(minutes / 6), 1).toString()} hours`;
}
