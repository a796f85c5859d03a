import type { EntityManager } from '@mikro-orm/sqlite';
import { KitPart } from './kit-part.entity.ts';

/** The parts of each kit among these, by the kit's number; what is no kit is not in it. */
async function kitsAmong(
  em: EntityManager,
  ids: readonly number[],
): Promise<Map<number, KitPart[]>> {
  const parts = await em.find(KitPart, { kitId: { $in: [...ids] } }, { orderBy: { id: 'asc' } });
  const kits = new Map<number, KitPart[]>();
  for (const part of parts) kits.set(part.kitId, [...(kits.get(part.kitId) ?? []), part]);
  return kits;
}

/** A kind of hardware with its parts: [hardware, how many] of a kit, as JSON. */
export interface WithParts {
  id: number;
  parts: string;
}

/**
 * These kinds of hardware and the parts of each kit among them, a row each with the columns that are asked for: in
 * plain SQL, since every price and every check asks for them.
 */
export function kindsWithParts<Row extends WithParts>(
  em: EntityManager,
  ids: readonly number[],
  columns: readonly string[],
): Promise<Row[]> {
  return em.execute<Row[]>(
    `WITH named (id) AS (SELECT DISTINCT value FROM json_each(?))
    SELECT h.id, ${columns.map((column) => `h.${column}`).join(', ')},
      (SELECT json_group_array(json_array(k.hardware_id, k.quantity) ORDER BY k.id) FROM kit_part k
        WHERE k.kit_id = h.id AND h.id IN (SELECT id FROM named)) AS parts
    FROM hardware h
    WHERE h.id IN (SELECT id FROM named
      UNION SELECT hardware_id FROM kit_part WHERE kit_id IN (SELECT id FROM named))`,
    [JSON.stringify(ids)],
  );
}

/** The parts of a kind that such a row holds, by the rows that came with it. */
export const partsAmong = <Row extends WithParts>(
  { parts }: WithParts,
  byId: ReadonlyMap<number, Row>,
): { part: Row; quantity: number }[] =>
  (JSON.parse(parts) as [number, number][]).flatMap(([id, quantity]) => {
    const part = byId.get(id);
    return part === undefined ? [] : [{ part, quantity }];
  });

interface Counted {
  hardwareId: number;
  quantity: number;
  /** Of it, what the pieces ordered take where nothing is lost. */
  ordered: number;
}

/** Counts of hardware with every kit as its parts, each kind once: what is really taken from the shelf. */
export async function throughKits(
  em: EntityManager,
  counted: readonly Counted[],
): Promise<Counted[]> {
  const kits = await kitsAmong(
    em,
    counted.map(({ hardwareId }) => hardwareId),
  );
  return summed(
    counted.flatMap((line) => {
      const parts = kits.get(line.hardwareId);
      if (parts === undefined) return [line];
      return parts.map((part) => ({
        hardwareId: part.hardwareId,
        quantity: part.quantity * line.quantity,
        ordered: part.quantity * line.ordered,
      }));
    }),
  );
}

/** Each kind once, with all that is counted of it. */
export function summed(counted: readonly Counted[]): Counted[] {
  const sums = new Map<number, Counted>();
  for (const { hardwareId, quantity, ordered } of counted) {
    const sum = sums.get(hardwareId) ?? { hardwareId, quantity: 0, ordered: 0 };
    sum.quantity += quantity;
    sum.ordered += ordered;
    sums.set(hardwareId, sum);
  }
  return [...sums.values()];
}
