import type { EntityManager } from '@mikro-orm/sqlite';
import { KitPart } from './kit-part.entity.ts';

/** The parts of each kit among these, by the kit's number; what is no kit is not in it. */
export async function kitsAmong(
  em: EntityManager,
  ids: readonly number[],
): Promise<Map<number, KitPart[]>> {
  const parts = await em.find(KitPart, { kitId: { $in: [...ids] } }, { orderBy: { id: 'asc' } });
  const kits = new Map<number, KitPart[]>();
  for (const part of parts) kits.set(part.kitId, [...(kits.get(part.kitId) ?? []), part]);
  return kits;
}

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
