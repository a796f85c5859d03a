import { Decimal } from 'decimal.js';
import type { adjustStock as endpoint, BodyOf, ReplyOf } from '@hidewright/contract';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { readMovements, readReservations } from '../modules/stock/read-ledger.ts';
import type { StockItem } from '../modules/stock/stock-item.ts';
import { adjustStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { requireOnHand } from './moved-since.ts';

/**
 * Sets the books to what was measured or counted on the rack, and says which jobs that leaves short.
 * @throws {Problem} 404, 409 naming what moved since the books were looked at, 422
 */
export async function adjustToCount(
  work: Work,
  asked: BodyOf<typeof endpoint>,
): Promise<ReplyOf<typeof endpoint>> {
  const item: StockItem =
    asked.of === 'lot' ? { lotId: asked.lotId } : { hardwareId: asked.hardwareId };
  const counted = asked.of === 'lot' ? scaled(new Decimal(asked.areaMm2), 3) : asked.counted;
  const seen = seenOf(asked);
  if (seen !== undefined) await requireOnHand(work, item, seen);
  const { name, say } = await describeItem(work.em, item);
  const { movement, broken } = await adjustStock(work, { ...item, counted, reason: asked.reason });
  await logDeed(work, {
    action:
      movement === null
        ? `found ${say(counted)} of ${name}, as the books say`
        : `set ${name} to ${say(counted)}`,
    subjectKind: asked.of,
    subjectId: asked.of === 'lot' ? asked.lotId : asked.hardwareId,
    detail: {
      reason: asked.reason,
      change: movement?.quantity ?? 0,
      jobsLeftShort: broken.map((held) => held.jobId),
    },
  });
  const [written] =
    movement === null ? [] : await readMovements(work.em, { id: movement.id, limit: 1 });
  return {
    movement: written ?? null,
    broken:
      broken.length === 0
        ? []
        : await readReservations(work.em, { ...askedItem(item), limit: broken.length }),
  };
}

function seenOf(asked: BodyOf<typeof endpoint>): number | undefined {
  if (asked.of === 'hardware') return asked.onHandSeenQuantity;
  return asked.onHandSeenAreaMm2 === undefined
    ? undefined
    : scaled(new Decimal(asked.onHandSeenAreaMm2), 3);
}

const askedItem = (item: StockItem) => ({
  lotId: item.lotId ?? undefined,
  hardwareId: item.hardwareId ?? undefined,
});
