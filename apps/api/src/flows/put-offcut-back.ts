import type { BodyOf, putOffcutBack as endpoint } from '@hidewright/contract';
import { offcutAreaMm2 } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findJob, requireBringsBack } from '../modules/jobs/find-job.ts';
import { findLot } from '../modules/lots/find-lot.ts';
import { drawTag } from '../modules/lots/lot-tags.ts';
import { Lot } from '../modules/lots/lot.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { returnAsOffcut } from '../modules/stock/stock-ledger.ts';
import { costOfOffcut } from '../modules/stock/taken-by-job.ts';
import type { Work } from '../work.ts';

type Asked = BodyOf<typeof endpoint>;

/**
 * Puts an offcut of what a job has taken on the rack, as a lot with a tag of its own that hangs on the lot it was cut
 * from. It bears its share of the cost by area; the job keeps the rest, to the cent.
 * @throws {Problem} 404, 409 when the job is not at the bench, 422 when the job has not taken as much
 */
export async function putOffcutBack(work: Work, jobId: number, asked: Asked): Promise<Lot> {
  const job = await findJob(work.em, jobId);
  await requireBringsBack(work.em, job);
  const from = await findLot(work.em, asked.lotId);
  const areaMm2 = new Decimal(offcutAreaMm2(asked));
  const cut = { jobId, fromLotId: from.id, quantity: scaled(areaMm2, 3) };
  const field = asked.areaMm2 === null ? 'widthMm' : 'areaMm2';
  const value = await costOfOffcut(work, { ...cut, field });
  const offcut = await hang(work, from, asked, { areaMm2, cost: value });
  const reason = `offcut of ${from.tag} from ${job.number}`;
  await returnAsOffcut(work, { ...cut, lotId: offcut.id, value, reason });
  const { say } = await describeItem(work.em, { lotId: offcut.id });
  await logDeed(work, {
    action: `put back ${say(cut.quantity)} of lot ${from.tag} as offcut ${offcut.tag}`,
    subjectKind: 'lot',
    subjectId: offcut.id,
    detail: { areaMm2: areaMm2.toString(), job: job.number },
  });
  return offcut;
}

/** The offcut with its tag: it is of the same leather, weight, shade and supplier's lot, and came on the same day. */
async function hang(
  work: Work,
  from: Lot,
  { widthMm, heightMm, place }: Asked,
  { areaMm2, cost }: { areaMm2: Decimal; cost: Decimal },
): Promise<Lot> {
  const { leatherId, weightOz, grade, shade, supplierLot, receivedOn, usablePercent } = from;
  const offcut = work.em.create(Lot, {
    tag: await drawTag(work.em),
    form: 'offcut',
    measuredAreaMm2: areaMm2,
    parentId: from.id,
    ...{ leatherId, weightOz, grade, shade, supplierLot, receivedOn, usablePercent, place, cost },
  });
  if (widthMm !== null) offcut.widthMm = new Decimal(widthMm);
  if (heightMm !== null) offcut.heightMm = new Decimal(heightMm);
  await work.em.flush();
  return offcut;
}
