import type { PatternDefinition } from '@hidewright/contract';
import type { RunHardware } from '@hidewright/domain';
import { priceText } from '../http/decimal-text.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import type { Work } from '../work.ts';

/** Each kind of hardware that the pattern or one of its options names, by its number. */
export async function hardwareKinds(
  work: Pick<Work, 'em'>,
  definition: PatternDefinition,
): Promise<Map<number, Hardware>> {
  const ids = [
    ...definition.hardware.map(({ hardwareId }) => hardwareId),
    ...(definition.options ?? []).flatMap(({ swaps }) =>
      swaps.flatMap(({ byHardwareId }) => (byHardwareId === null ? [] : [byHardwareId])),
    ),
  ];
  const kinds = await work.em.find(Hardware, { id: { $in: ids } });
  return new Map(kinds.map((kind) => [kind.id, kind]));
}

/** A line of the pattern's hardware at today's price; none where the kind is gone. */
export function hardwareLine(
  kinds: ReadonlyMap<number, Hardware>,
  { hardwareId, ...line }: PatternDefinition['hardware'][number],
): RunHardware[] {
  const kind = kinds.get(hardwareId);
  if (kind === undefined) return [];
  return [{ ...line, hardwareId, name: kind.name, unitPrice: priceText(kind.unitPrice) }];
}

/** The options that a pattern has, each with all the hardware that a piece then takes. */
export function optionsOf(
  definition: PatternDefinition,
  kinds: ReadonlyMap<number, Hardware>,
): { name: string; hardware: RunHardware[] }[] {
  return (definition.options ?? []).map(({ name, swaps }) => {
    const out = new Set(swaps.map(({ hardwareId }) => hardwareId));
    const stays = definition.hardware.filter(({ hardwareId }) => !out.has(hardwareId));
    const comes = swaps.flatMap(({ hardwareId, byHardwareId, perPiece }) => {
      if (byHardwareId === null) return [];
      const before = definition.hardware.find((line) => line.hardwareId === hardwareId);
      return [{ ...before, hardwareId: byHardwareId, perPiece }];
    });
    return { name, hardware: [...stays, ...comes].flatMap((line) => hardwareLine(kinds, line)) };
  });
}
