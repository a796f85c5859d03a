import type { HardwareUnit } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Leather } from '../../modules/leathers/leather.entity.ts';
import type { BoughtRow } from '../order-suggestions/item-terms.ts';

/** A leather as it is bought, in the database's own units. */
export interface BoughtLeather extends BoughtRow {
  of: 'leather';
  name: string;
  whole_form: Leather['wholeForm'];
  usable_percent: number;
  weight_low_oz: number | null;
  weight_high_oz: number | null;
}

/** In plain SQL, since every check asks for it. */
export function boughtLeathers(
  em: EntityManager,
  ids: readonly number[],
): Promise<BoughtLeather[]> {
  return em.execute<BoughtLeather[]>(
    `SELECT 'leather' AS "of", id, name, price_per_ft2 AS price, 1 AS pack_size, supplier_id, whole_form,
      CASE WHEN whole_form IS NOT NULL THEN whole_area_mm2 END AS whole_area, whole_usable_percent AS usable_percent,
      weight_low_oz, weight_high_oz
    FROM leather WHERE id IN (SELECT value FROM json_each(?)) ORDER BY id`,
    [JSON.stringify(ids)],
  );
}

/** A kind of hardware or supplies in the same way. */
interface BoughtKind extends BoughtRow {
  of: 'hardware';
  name: string;
  kind: 'hardware' | 'supplies';
  unit: HardwareUnit;
  from_customer: number;
}

export function boughtKinds(em: EntityManager, ids: readonly number[]): Promise<BoughtKind[]> {
  return em.execute<BoughtKind[]>(
    `SELECT 'hardware' AS "of", id, name, unit_price AS price, pack_size, supplier_id, NULL AS whole_area, kind, unit,
      from_customer
    FROM hardware WHERE id IN (SELECT value FROM json_each(?)) ORDER BY id`,
    [JSON.stringify(ids)],
  );
}
