import type { Pattern as PatternReply, PatternDefinition } from '@hidewright/contract';
import { kitSettingFaults, type Stack } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { readSettings } from '../hardware/read-settings.ts';
import type { Leather } from '../leathers/leather.entity.ts';

/** The hardware of a pattern by name, with what speaks against setting it through the pattern's leather. */
export async function describeHardware(
  em: EntityManager,
  { hardware: lines }: PatternDefinition,
  leather: Leather | null,
): Promise<PatternReply['hardware']> {
  const ids = lines.map(({ hardwareId }) => hardwareId);
  const settings = await readSettings(em, ids);
  return lines.map(({ hardwareId, perPiece, per = 'piece', layers }) => {
    const kind = settings.get(hardwareId);
    const remarks =
      kind === undefined ? [] : kitSettingFaults(kind, kind.parts, stackOf(layers, leather));
    const { name = '', unit = 'piece' } = kind ?? {};
    return { hardwareId, perPiece, per, name, unit, remarks };
  });
}

/** Which lots it will be cut from, nobody knows yet: it is the leather's own range. */
const stackOf = (layers: number | null | undefined, leather: Leather | null): Stack => ({
  layers: layers ?? null,
  weightLowOz: leather?.weightLowOz?.toString() ?? null,
  weightHighOz: leather?.weightHighOz?.toString() ?? null,
});
