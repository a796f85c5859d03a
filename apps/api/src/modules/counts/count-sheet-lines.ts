import type { EntityManager } from '@mikro-orm/sqlite';
import { binTag, type HardwareUnit } from '@hidewright/domain';

/** A line of a sheet with everything that is said about its item. */
export interface SheetLine {
  id: number;
  lotId: number | null;
  hardwareId: number | null;
  tag: string;
  name: string;
  unit: HardwareUnit | null;
  form: string | null;
  place: string;
  added: boolean;
  counted: number | null;
  book: number | null;
  unmeasured: boolean;
  again: boolean;
  countedAt: string | null;
  countedByName: string | null;
  onHand: number;
  reserved: number;
  /** In hundredths, once it is posted. */
  posted: number | null;
}

interface Row {
  id: number;
  lot_id: number | null;
  hardware_id: number | null;
  tag: string | null;
  name: string;
  unit: HardwareUnit | null;
  form: string | null;
  place: string;
  added: number;
  counted: number | null;
  book: number | null;
  unmeasured: number;
  again: number;
  counted_at: string | null;
  counted_by_name: string | null;
  on_hand: number;
  reserved: number;
  posted: number | null;
}

const sql = `SELECT l.*, lot.tag, lot.form, COALESCE(lot.place, h.bin, '') AS place, COALESCE(leather.name, h.name) AS name, h.unit,
    COALESCE(b.on_hand, 0) AS on_hand, COALESCE(b.reserved, 0) AS reserved, m.value AS posted
  FROM count_line l
  LEFT JOIN lot ON lot.id = l.lot_id
  LEFT JOIN leather ON leather.id = lot.leather_id
  LEFT JOIN hardware h ON h.id = l.hardware_id
  LEFT JOIN stock_balance b ON b.lot_id IS l.lot_id AND b.hardware_id IS l.hardware_id
  LEFT JOIN stock_movement m ON m.id = l.movement_id
  WHERE l.count_id = ? ORDER BY COALESCE(lot.place, h.bin, '') = '', place, l.lot_id IS NULL, lot.tag, h.name, l.id`;

/** A sheet's lines as one goes along: by place, there lots by tag and hardware by name; last what has no place. */
export async function readSheetLines(em: EntityManager, countId: number): Promise<SheetLine[]> {
  const rows = await em.execute<Row[]>(sql, [countId]);
  return rows.map((row) => ({
    id: row.id,
    lotId: row.lot_id,
    hardwareId: row.hardware_id,
    tag: row.tag ?? binTag(row.hardware_id ?? 0),
    name: row.name,
    unit: row.unit,
    form: row.form,
    place: row.place,
    added: row.added === 1,
    counted: row.counted,
    book: row.book,
    unmeasured: row.unmeasured === 1,
    again: row.again === 1,
    countedAt: row.counted_at,
    countedByName: row.counted_by_name,
    onHand: row.on_hand,
    reserved: row.reserved,
    posted: row.posted,
  }));
}
