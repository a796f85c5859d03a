import type { Hardware as HardwareReply } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { kitCounts, partStock, type PartStock } from './kit-counts.ts';

/** What hardware has to do with other hardware. */
export interface Related {
  partsOf(id: number): PartStock[];
  repliesFor(id: number): Pick<HardwareReply, 'parts' | 'partOf' | 'standIns'>;
}

interface InKit {
  part_id: number;
  id: number;
  name: string;
}

interface StandInRow {
  of_id: number;
  id: number;
  name: string;
  both_ways: number;
  free: number;
}

const inKitsSql = `SELECT k.hardware_id AS part_id, h.id, h.name FROM kit_part k JOIN hardware h ON h.id = k.kit_id
  WHERE k.hardware_id IN (SELECT value FROM json_each(?)) ORDER BY h.name`;

const standInsSql = `SELECT s.hardware_id AS of_id, h.id, h.name,
    EXISTS (SELECT 1 FROM stand_in back WHERE back.hardware_id = s.by_hardware_id
      AND back.by_hardware_id = s.hardware_id) AS both_ways,
    COALESCE(MAX(0, b.on_hand - b.reserved), 0) AS free
  FROM stand_in s JOIN hardware h ON h.id = s.by_hardware_id LEFT JOIN stock_balance b ON b.hardware_id = h.id
  WHERE s.hardware_id IN (SELECT value FROM json_each(?)) ORDER BY s.id`;

/** Parts, kits and stand-ins of a page of hardware, in four queries. */
export async function readRelated(em: EntityManager, ids: readonly number[]): Promise<Related> {
  const asked = [JSON.stringify(ids)];
  const parts = await partStock(em, ids);
  const kits = await em.execute<InKit[]>(inKitsSql, asked);
  const standIns = await em.execute<StandInRow[]>(standInsSql, asked);
  // What stands in can be a kit, which is as many as its own parts make up.
  const others = await partStock(
    em,
    standIns.map(({ id }) => id),
  );
  const freeOf = (row: StandInRow) => {
    const own = others.filter(({ kitId }) => kitId === row.id);
    return own.length === 0 ? row.free : kitCounts(own).free;
  };
  const partsOf = (id: number) => parts.filter(({ kitId }) => kitId === id);
  return {
    partsOf,
    repliesFor: (id) => ({
      parts: partsOf(id).map(({ hardwareId, name, quantity, free }) => ({
        ...{ hardwareId, name, quantity, free },
      })),
      partOf: kits
        .filter((kit) => kit.part_id === id)
        .map((kit) => ({ hardwareId: kit.id, name: kit.name })),
      standIns: standIns
        .filter((row) => row.of_id === id)
        .map((row) => ({
          hardwareId: row.id,
          name: row.name,
          bothWays: row.both_ways === 1,
          free: freeOf(row),
        })),
    }),
  };
}
