import type { Today } from '@hidewright/contract';
import type { Work } from '../../work.ts';

const belowMark = `SELECT h.id, h.name, h.reorder_at AS reorderAt, COALESCE(b.on_hand - b.reserved, 0) AS free
  FROM hardware h LEFT JOIN stock_balance b ON b.hardware_id = h.id
  WHERE h.active = 1 AND COALESCE(b.on_hand - b.reserved, 0) < h.reorder_at
  ORDER BY COALESCE(b.on_hand - b.reserved, 0) * 1.0 / h.reorder_at, h.name LIMIT 6`;

/** Hardware and supplies of which less is free than the shop wants to keep. */
export async function short(work: Work): Promise<NonNullable<Today['short']>> {
  const rows =
    await work.em.execute<{ id: number; name: string; reorderAt: number; free: number }[]>(
      belowMark,
    );
  return rows.map(({ id, ...item }) => ({ ...item, to: `/stockroom/hardware/${id}` }));
}
