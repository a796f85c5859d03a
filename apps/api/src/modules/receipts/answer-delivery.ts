import type {
  answerDelivery as endpoint,
  BodyOf,
  Receipt as ReceiptReply,
} from '@hidewright/contract';
import { wrongState } from '../../http/problem.ts';
import { sayDay } from '../../say-day.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { DeliveryAnswer } from './delivery-answer.entity.ts';
import { raiseVersion } from './raise-version.ts';
import { readOneReceipt } from './read-receipts.ts';
import type { Receipt } from './receipt.entity.ts';

type Typed = BodyOf<typeof endpoint>;

/**
 * Writes down that the owner lets a delivery's price stand, or does not claim what is short in it. It holds for what
 * stands now: of another difference the owner is asked again, and a claim may follow all the same.
 * @throws {Problem} 409 when there is nothing to answer, or it is answered already
 */
export async function answerDelivery(
  work: Work,
  receipt: Receipt,
  { matter, reason }: Typed,
): Promise<void> {
  requireOpen(matter, await readOneReceipt(work.em, receipt.id));
  const { priceDifference, missingAreaMm2 } = receipt;
  const { id: actorId, name: actorName } = work.actor;
  work.em.create(DeliveryAnswer, {
    receiptId: receipt.id,
    matter,
    ...(matter === 'price' ? { priceDifference } : { missingAreaMm2 }),
    reason,
    at: work.now.toISOString(),
    actorId,
    actorName,
  });
  await raiseVersion(work, receipt, receipt.version);
  const day = sayDay(receipt.receivedOn);
  await logDeed(work, {
    action:
      matter === 'price'
        ? `let the price of the delivery of ${day} stand`
        : `chose not to claim what is short in the delivery of ${day}`,
    subjectKind: 'delivery',
    subjectId: receipt.id,
    detail: { reason },
  });
}

function requireOpen(matter: Typed['matter'], now: ReceiptReply): void {
  const why = matter === 'price' ? whyPriceIsClosed(now) : whyShortIsClosed(now);
  if (why !== null) throw wrongState(why);
}

function whyPriceIsClosed({ purchaseOrderId, priceDifference, letStand }: ReceiptReply) {
  if (purchaseOrderId === null) return 'This came without an order, so no price was agreed for it.';
  if (Number(priceDifference) === 0) return 'This delivery cost what was ordered.';
  return letStand ? `${letStand.by} has let this price stand already.` : null;
}

function whyShortIsClosed({ purchaseOrderId, lines, notClaimed }: ReceiptReply) {
  if (purchaseOrderId === null)
    return 'This came without an order, so there is no supplier to claim it from.';
  const short = lines.filter(({ marked }) => marked?.short);
  if (short.length === 0) return 'No lot of this delivery is short of its mark.';
  if (short.every(({ claimId }) => claimId !== null))
    return 'Everything that was short in this delivery is claimed already.';
  return notClaimed ? `${notClaimed.by} has said already that this is not claimed.` : null;
}
