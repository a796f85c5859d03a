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
  /** The pattern, or a version of it. */
  pattern: { id: number } | { versionId: number };
  /** Only orders before this one, or before the one that a quote became. */
  before: { orderId: number } | { quoteId: number | null };
}

/**
 * The lots that this customer's last order of a pattern was cut from, or, where nothing of it is taken yet, those that
 * are held for it; null where there is none.
 */
export async function readLastTime(em: EntityManager, asked: Asked): Promise<LastTime | null> {
  const earlier = await findEarlier(em, asked);
  if (earlier === undefined) return null;
  const taken = (await readUses(em, { orderId: earlier.id })).map(({ lotId }) => lotId);
  const lotIds = taken.length > 0 ? taken : await readHeld(em, earlier.id);
  const relatives = await readRelatives(em, lotIds);
  return {
    orderId: earlier.id,
    orderNumber: earlier.number,
    title: earlier.title,
    shippedOn: earlier.shipped_on,
    cut: taken.length > 0,
    lots: lotIds.map((lotId) => swatchOf(lineTo(relatives, lotId))),
  };
}

async function findEarlier(em: EntityManager, asked: Asked): Promise<Earlier | undefined> {
  const { customerId, pattern, before } = asked;
  const [patternId, versionId] = 'id' in pattern ? [pattern.id, null] : [null, pattern.versionId];
  const [orderId, quoteId] = 'orderId' in before ? [before.orderId, null] : [null, before.quoteId];
  const [row] = await em.execute<Earlier[]>(
    `SELECT o.id, o.number, o.title, o.shipped_on FROM customer_order o JOIN job j ON j.order_id = o.id
       JOIN pattern_version v ON v.id = j.pattern_version_id
     WHERE o.customer_id = ? AND o.state <> 'cancelled'
       AND v.pattern_id = COALESCE(?, (SELECT pattern_id FROM pattern_version WHERE id = ?))
       AND (EXISTS (SELECT 1 FROM stock_movement m WHERE m.job_id = j.id AND m.lot_id IS NOT NULL
           GROUP BY m.job_id HAVING SUM(m.quantity) < 0)
         OR EXISTS (SELECT 1 FROM reservation r WHERE r.job_id = j.id AND r.lot_id IS NOT NULL AND r.open > 0))
       AND o.id < COALESCE(?, (SELECT id FROM customer_order WHERE quote_id = ?), ${Number.MAX_SAFE_INTEGER})
     ORDER BY o.id DESC LIMIT 1`,
    [customerId, patternId, versionId, orderId, quoteId],
  );
  return row;
}

async function readHeld(em: EntityManager, orderId: number): Promise<number[]> {
  const rows = await em.execute<{ lot_id: number }[]>(
    `SELECT DISTINCT r.lot_id FROM reservation r JOIN job j ON j.id = r.job_id
     WHERE j.order_id = ? AND r.lot_id IS NOT NULL AND r.open > 0 ORDER BY r.lot_id`,
    [orderId],
  );
  return rows.map((row) => row.lot_id);
}

/** What a line of lots ends in, with the photo that is nearest to it. */
function swatchOf(line: readonly Relative[]): LastTime['lots'][number] {
  const { lotId, tag, shade, onHandAreaMm2 } = line.at(-1) as Relative;
  const drawn = line.findLast(({ photoHash }) => photoHash !== null);
  const photo = drawn?.photoHash ? { lotId: drawn.lotId, hash: drawn.photoHash } : null;
  return { lotId, tag, shade, onHandAreaMm2, photo };
}
