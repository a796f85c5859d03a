import type { EntityManager } from '@mikro-orm/sqlite';
import { describeItem } from './described-item.ts';
import { keysOf, type StockItem } from './stock-item.ts';

/** Which jobs hold of an item, and how much, in words: "12.4 ft² for J-0012". */
export async function holdersOf(em: EntityManager, item: StockItem): Promise<string[]> {
  const { lotId, hardwareId } = keysOf(item);
  const rows = await em.execute<{ number: string; open: number }[]>(
    `SELECT j.number, SUM(r.open) AS open FROM reservation r JOIN job j ON j.id = r.job_id
     WHERE r.lot_id IS ? AND r.hardware_id IS ? AND r.open > 0 GROUP BY j.id ORDER BY j.id`,
    [lotId, hardwareId],
  );
  if (rows.length === 0) return [];
  const { say } = await describeItem(em, item);
  return rows.map(({ number, open }) => `${say(open)} for ${number}`);
}
