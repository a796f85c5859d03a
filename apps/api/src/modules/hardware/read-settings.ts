import type { Setting, Stack } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Leather } from '../leathers/leather.entity.ts';
import { Hardware } from './hardware.entity.ts';
import { kitsAmong } from './kits.ts';

/** Which kind it is, and how it is set. */
export type NamedSetting = Setting & Pick<Hardware, 'id' | 'name' | 'unit'>;

/** With the parts of a kit. */
interface KitSetting extends NamedSetting {
  parts: NamedSetting[];
}

/** What is known of setting these kinds of hardware, by their number. */
export async function readSettings(
  em: EntityManager,
  ids: readonly number[],
): Promise<Map<number, KitSetting>> {
  const kits = await kitsAmong(em, ids);
  const partIds = [...kits.values()].flat().map(({ hardwareId }) => hardwareId);
  const found = await em.find(Hardware, { id: { $in: [...ids, ...partIds] } });
  const byId = new Map(found.map((kind) => [kind.id, settingOf(kind)]));
  return new Map(
    [...byId].map(([id, setting]) => {
      const parts = (kits.get(id) ?? []).flatMap((part) => byId.get(part.hardwareId) ?? []);
      return [id, { ...setting, parts }];
    }),
  );
}

const settingOf = ({ id, name, unit, settingDie, settingDieHere, ...kind }: Hardware) => ({
  ...{ id, name, unit, settingDie, settingDieHere },
  postLengthMm: kind.postLengthMm?.toString() ?? null,
  stackMinMm: kind.stackMinMm?.toString() ?? null,
  stackMaxMm: kind.stackMaxMm?.toString() ?? null,
});

/** What a line of a pattern's hardware is set through: its layers of the pattern's leather. */
export const stackOf = (
  { layers = null }: { layers?: number | null | undefined },
  leather: Leather | null,
): Stack => ({
  layers,
  weightLowOz: leather?.weightLowOz?.toString() ?? null,
  weightHighOz: leather?.weightHighOz?.toString() ?? null,
});
