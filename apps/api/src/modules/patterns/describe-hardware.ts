import type { Pattern as PatternReply, PatternDefinition } from '@hidewright/contract';
import { kitSettingFaults } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Hardware } from '../hardware/hardware.entity.ts';
import { kitsAmong } from '../hardware/kits.ts';
import type { Leather } from '../leathers/leather.entity.ts';

/** The hardware of a pattern by name, with what speaks against setting it through the pattern's leather. */
export async function describeHardware(
  em: EntityManager,
  { hardware: lines }: PatternDefinition,
  leather: Leather | null,
): Promise<PatternReply['hardware']> {
  const ids = lines.map(({ hardwareId }) => hardwareId);
  const kits = await kitsAmong(em, ids);
  const partIds = [...kits.values()].flat().map(({ hardwareId }) => hardwareId);
  const found = await em.find(Hardware, { id: { $in: [...ids, ...partIds] } });
  const byId = new Map(found.map((each) => [each.id, each]));
  return lines.map(({ hardwareId, perPiece, per = 'piece', layers }) => {
    const kind = byId.get(hardwareId);
    const parts = (kits.get(hardwareId) ?? []).flatMap((part) => byId.get(part.hardwareId) ?? []);
    const stack = { layers: layers ?? null, ...weightOf(leather) };
    const remarks =
      kind === undefined ? [] : kitSettingFaults(settingOf(kind), parts.map(settingOf), stack);
    const { name = '', unit = 'piece' } = kind ?? {};
    return { hardwareId, perPiece, per, name, unit, remarks };
  });
}

const weightOf = (leather: Leather | null) => ({
  weightLowOz: leather?.weightLowOz?.toString() ?? null,
  weightHighOz: leather?.weightHighOz?.toString() ?? null,
});

const settingOf = ({ name, settingDie, settingDieHere, ...kind }: Hardware) => ({
  ...{ name, settingDie, settingDieHere },
  postLengthMm: kind.postLengthMm?.toString() ?? null,
  stackMinMm: kind.stackMinMm?.toString() ?? null,
  stackMaxMm: kind.stackMaxMm?.toString() ?? null,
});
