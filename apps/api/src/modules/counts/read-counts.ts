import type { EntityManager } from '@mikro-orm/sqlite';
import type { CountCard, CountPlace, CountState } from '@hidewright/contract';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { countedHardware } from './counted-hardware.ts';

interface Row {
  id: number;
  title: string;
  state: CountState;
  opened_at: string;
  opened_by_name: string;
  handed_in_at: string | null;
  handed_in_by_name: string | null;
  settled_at: string | null;
  settled_by_name: string | null;
  line_count: number;
  counted_count: number;
  version: number;
}

const cards = `SELECT c.*,
    (SELECT COUNT(*) FROM count_line l WHERE l.count_id = c.id) AS line_count,
    (SELECT COUNT(*) FROM count_line l WHERE l.count_id = c.id AND l.counted_at IS NOT NULL) AS counted_count
  FROM stock_count c`;

/** Count sheets, newest first. */
export async function readCountCards(
  em: EntityManager,
  asked: { id?: number | undefined; below?: number | undefined; limit: number },
): Promise<CountCard[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'c.id = ?'),
    ...when(asked.below, 'c.id < ?'),
  ]);
  const rows = await em.execute<Row[]>(`${cards} ${where} ORDER BY c.id DESC LIMIT ?`, [
    ...values,
    asked.limit,
  ]);
  return rows.map((row) => ({
    id: row.id,
    title: row.title,
    state: row.state,
    openedAt: row.opened_at,
    openedByName: row.opened_by_name,
    handedInAt: row.handed_in_at,
    handedInByName: row.handed_in_by_name,
    settledAt: row.settled_at,
    settledByName: row.settled_by_name,
    lineCount: row.line_count,
    countedCount: row.counted_count,
    version: row.version,
  }));
}

/** Where lots lie and hardware has its bin, with how many of each. */
export async function readPlaces(em: EntityManager): Promise<CountPlace[]> {
  return em.execute(
    `SELECT place, SUM(lots) AS lots, SUM(bins) AS bins FROM (
       SELECT lot.place, COUNT(*) AS lots, 0 AS bins FROM lot JOIN stock_balance b ON b.lot_id = lot.id
       WHERE b.on_hand > 0 GROUP BY lot.place
       UNION ALL
       SELECT h.bin, 0, COUNT(*) FROM ${countedHardware} AND h.bin <> '' GROUP BY h.bin)
     GROUP BY place ORDER BY place`,
  );
}
