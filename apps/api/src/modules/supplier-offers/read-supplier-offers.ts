import type { SupplierOfferReply } from '@hidewright/contract';
import type { OfferBreak } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { notFound } from '../../http/problem.ts';

interface Asked {
  id?: number | undefined;
  leatherId?: number | undefined;
  hardwareId?: number | undefined;
  supplierId?: number | undefined;
  /** Any of these. */
  of?: { leatherIds: readonly number[]; hardwareIds: readonly number[] } | undefined;
  /** Those that come after this one. */
  after?: number | undefined;
  limit?: number;
}

interface Row {
  id: number;
  leather_id: number | null;
  hardware_id: number | null;
  name: string;
  supplier_id: number;
  supplier_name: string;
  supplier_days: number;
  article_number: string;
  lead_days: number | null;
  minimum: number | null;
  multiple: number | null;
  breaks: string;
  preferred: number;
  version: number;
}

const offered = `
  SELECT o.*, s.name AS supplier_name, s.lead_days AS supplier_days, COALESCE(l.name, h.name) AS name
  FROM supplier_offer o JOIN supplier s ON s.id = o.supplier_id
  LEFT JOIN leather l ON l.id = o.leather_id LEFT JOIN hardware h ON h.id = o.hardware_id`;

const ofAny = `o.leather_id IN (SELECT value FROM json_each(?, '$.leatherIds'))
  OR o.hardware_id IN (SELECT value FROM json_each(?, '$.hardwareIds'))`;

/** Of the list, which has the preferred first. */
const later = `(-o.preferred, o.id) > (SELECT -preferred, id FROM supplier_offer WHERE id = ?)`;

/** Offers for one thing or of one supplier, the preferred one of each thing first. */
export async function readSupplierOffers(
  em: EntityManager,
  asked: Asked,
): Promise<SupplierOfferReply[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'o.id = ?'),
    ...when(asked.leatherId, 'o.leather_id = ?'),
    ...when(asked.hardwareId, 'o.hardware_id = ?'),
    ...when(asked.supplierId, 'o.supplier_id = ?'),
    ...when(asked.after, later),
    ...when(asked.of && JSON.stringify(asked.of), ofAny, (json) => [json, json]),
  ]);
  const sql = `${offered} ${where} ORDER BY o.preferred DESC, o.id LIMIT ?`;
  const rows = await em.execute<Row[]>(sql, [...values, asked.limit ?? 1]);
  return rows.map(toReply);
}

/** @throws {Problem} 404 */
export async function readOneOffer(em: EntityManager, id: number): Promise<SupplierOfferReply> {
  const [found] = await readSupplierOffers(em, { id });
  if (found === undefined) throw notFound('offer');
  return found;
}

function toReply(row: Row): SupplierOfferReply {
  const places = row.leather_id === null ? 0 : 3;
  const text = (kept: number | null) => (kept === null ? null : unscaled(kept, places).toFixed());
  return {
    id: row.id,
    of: row.leather_id === null ? 'hardware' : 'leather',
    leatherId: row.leather_id,
    hardwareId: row.hardware_id,
    name: row.name,
    supplierId: row.supplier_id,
    supplierName: row.supplier_name,
    articleNumber: row.article_number,
    leadDays: row.lead_days,
    usualLeadDays: row.lead_days ?? row.supplier_days,
    unit: row.leather_id === null ? 'piece' : 'mm2',
    minimum: text(row.minimum),
    multiple: text(row.multiple),
    breaks: JSON.parse(row.breaks) as OfferBreak[],
    preferred: row.preferred === 1,
    version: row.version,
  };
}
