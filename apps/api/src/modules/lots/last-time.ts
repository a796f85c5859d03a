import type { LastTime } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { lineTo, readRelatives, type Relative } from './read-lineage.ts';
import { readUses } from './read-uses.ts';

interface Earlier {
  id: number;
  number: string;
  title: string;
  shipped_on: string | null;
}

interface Asked {
  customerId: number;
  patternVersionId: number;
  /** Only orders before this one. */
  beforeOrderId?: number;
}

/** The lots that this customer's last order of a pattern was cut from; null where there is none. */
export async function readLastTime(em: EntityManager, asked: Asked): Promise<LastTime | null> {
  const earlier = await findEarlier(em, asked);
  if (earlier === undefined) return null;
  const lotIds = (await readUses(em, { orderId: earlier.id })).map(({ lotId }) => lotId);
  const relatives = await readRelatives(em, lotIds);
  return {
    orderId: earlier.id,
    orderNumber: earlier.number,
    title: earlier.title,
    shippedOn: earlier.shipped_on,
    lots: lotIds.map((lotId) => swatchOf(lineTo(relatives, lotId))),
  };
}

async function findEarlier(em: EntityManager, asked: Asked): Promise<Earlier | undefined> {
  const { customerId, patternVersionId, beforeOrderId = Number.MAX_SAFE_INTEGER } = asked;
  const [row] = await em.execute<Earlier[]>(
    `SELECT o.id, o.number, o.title, o.shipped_on FROM customer_order o JOIN job j ON j.order_id = o.id
       JOIN pattern_version v ON v.id = j.pattern_version_id
     WHERE o.customer_id = ? AND o.id < ? AND o.state <> 'cancelled'
       AND v.pattern_id = (SELECT pattern_id FROM pattern_version WHERE id = ?)
       AND EXISTS (SELECT 1 FROM stock_movement m WHERE m.job_id = j.id AND m.lot_id IS NOT NULL)
     ORDER BY o.id DESC LIMIT 1`,
    [customerId, beforeOrderId, patternVersionId],
  );
  return row;
}

/** What a line of lots ends in, with the photo that is nearest to it. */
function swatchOf(line: readonly Relative[]): LastTime['lots'][number] {
  const { lotId, tag, shade, onHandAreaMm2 } = line.at(-1) as Relative;
  const drawn = line.findLast(({ photoHash }) => photoHash !== null);
  const photo = drawn?.photoHash ? { lotId: drawn.lotId, hash: drawn.photoHash } : null;
  return { lotId, tag, shade, onHandAreaMm2, photo };
}
