import type { StandInStock } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';

interface Row {
  of_id: number;
  by_id: number;
  name: string;
  part_id: number;
  quantity: number;
}

interface StandIns {
  of: (hardwareId: number) => StandInStock[];
  /** Everything that they are taken from. */
  partIds: number[];
}

/** What may be taken in place of some hardware, kits as their parts; in one question whatever the number. */
export async function readStandIns(
  em: EntityManager,
  hardwareIds: readonly number[],
): Promise<StandIns> {
  const rows = await em.execute<Row[]>(
    `SELECT s.hardware_id AS of_id, h.id AS by_id, h.name,
      COALESCE(k.hardware_id, h.id) AS part_id, COALESCE(k.quantity, 1) AS quantity
    FROM stand_in s JOIN hardware h ON h.id = s.by_hardware_id AND h.active = 1
      LEFT JOIN kit_part k ON k.kit_id = h.id
    WHERE s.hardware_id IN (SELECT value FROM json_each(?)) ORDER BY s.id, k.id`,
    [JSON.stringify(hardwareIds)],
  );
  return { of: (id) => standInsOf(rows, id), partIds: rows.map((row) => row.part_id) };
}

function standInsOf(rows: readonly Row[], hardwareId: number): StandInStock[] {
  const own = rows.filter((row) => row.of_id === hardwareId);
  return [...new Set(own.map((row) => row.by_id))].map((id) => {
    const parts = own.filter((row) => row.by_id === id);
    return {
      name: parts[0]?.name ?? '',
      parts: parts.map((row) => ({ hardwareId: row.part_id, quantity: row.quantity })),
    };
  });
}
