import type { FamilyMember, LotOrigin } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { linesOut } from './read-out.ts';

interface MemberRow {
  id: number;
  tag: string;
  form: FamilyMember['form'];
  parent_id: number | null;
  shade: string;
  place: string;
  measured_area_mm2: number;
  on_hand: number;
  out: number;
  service: string | null;
  photo_hash: string | null;
  received_on: string;
  supplier_lot: string;
  supplier_name: string | null;
  purchase_order_id: number | null;
  purchase_order_number: string | null;
}

/** A lot among its relatives. */
export interface Relative extends FamilyMember {
  photoHash: string | null;
  /** As it came in; of an offcut, only the day and the supplier's lot. */
  origin: LotOrigin;
}

/** Every lot that was cut from the same one as any of these, that one first, then in the order of cutting. */
export async function readRelatives(
  em: EntityManager,
  lotIds: readonly number[],
): Promise<Map<number, Relative>> {
  const rows = await em.execute<MemberRow[]>(
    `WITH RECURSIVE up (id, parent_id) AS (
       SELECT id, parent_id FROM lot WHERE id IN (SELECT value FROM json_each(?))
       UNION SELECT lot.id, lot.parent_id FROM up JOIN lot ON lot.id = up.parent_id),
     family (id) AS (
       SELECT id FROM up WHERE parent_id IS NULL
       UNION SELECT lot.id FROM family JOIN lot ON lot.parent_id = family.id)
     SELECT lot.*, COALESCE(b.on_hand, 0) AS on_hand, s.name AS supplier_name, l.service,
       COALESCE((SELECT SUM(l.quantity) FROM ${linesOut} WHERE l.from_lot_id = lot.id), 0) AS out,
       p.id AS purchase_order_id, p.number AS purchase_order_number
     FROM family JOIN lot ON lot.id = family.id
     LEFT JOIN stock_balance b ON b.lot_id = lot.id
     LEFT JOIN purchase_line l ON l.id = lot.purchase_line_id
     LEFT JOIN purchase_order p ON p.id = l.purchase_order_id
     LEFT JOIN supplier s ON s.id = p.supplier_id
     ORDER BY lot.id`,
    [JSON.stringify(lotIds)],
  );
  return new Map(rows.map((row) => [row.id, relativeOf(row)]));
}

/** From the lot that came in down to this one. */
export function lineTo(relatives: ReadonlyMap<number, Relative>, lotId: number): Relative[] {
  const lot = relatives.get(lotId);
  if (lot === undefined) return [];
  return lot.parentId === null ? [lot] : [...lineTo(relatives, lot.parentId), lot];
}

/** What a reply says of a lot in its family. */
export function memberOf(relative: Relative): FamilyMember {
  const { photoHash: _photo, origin: _origin, ...member } = relative;
  return member;
}

function relativeOf(row: MemberRow): Relative {
  return {
    lotId: row.id,
    tag: row.tag,
    form: row.form,
    parentId: row.parent_id,
    shade: row.shade,
    place: row.place,
    measuredAreaMm2: unscaled(row.measured_area_mm2, 3).toFixed(),
    service: row.service,
    onHandAreaMm2: unscaled(row.on_hand, 3).toFixed(),
    outAreaMm2: unscaled(row.out, 3).toFixed(),
    photoHash: row.photo_hash,
    origin: {
      receivedOn: row.received_on,
      supplierLot: row.supplier_lot,
      supplierName: row.supplier_name,
      purchaseOrderId: row.purchase_order_id,
      purchaseOrderNumber: row.purchase_order_number,
    },
  };
}
