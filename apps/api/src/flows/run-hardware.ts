import type { PatternDefinition } from '@hidewright/contract';
import { pricesInKit, type RunHardware } from '@hidewright/domain';
import { priceText } from '../http/decimal-text.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { kitsAmong } from '../modules/hardware/kits.ts';
import type { Work } from '../work.ts';

/** A kind of hardware as a run counts it: of a kit its parts, each at its price in that kit. */
interface Kind {
  name: string;
  unitPrice: string;
  parts: { hardwareId: number; name: string; unitPrice: string; quantity: number }[];
}
export type Kinds = ReadonlyMap<number, Kind>;
type Line = PatternDefinition['hardware'][number];

/** Each kind of hardware that the patterns or one of their options name, by its number. */
export async function hardwareKinds(
  { em }: Pick<Work, 'em'>,
  definitions: readonly PatternDefinition[],
): Promise<Kinds> {
  const ids = definitions.flatMap(({ hardware, options = [] }) => [
    ...hardware.map(({ hardwareId }) => hardwareId),
    ...options.flatMap(({ swaps }) =>
      swaps.flatMap(({ byHardwareId }) => (byHardwareId === null ? [] : [byHardwareId])),
    ),
  ]);
  const kits = await kitsAmong(em, ids);
  const partIds = [...kits.values()].flat().map(({ hardwareId }) => hardwareId);
  const all = await em.find(Hardware, { id: { $in: [...ids, ...partIds] } });
  const byId = new Map(all.map((each) => [each.id, each]));
  return new Map(
    all.map((each) => {
      const parts = (kits.get(each.id) ?? []).flatMap(({ hardwareId, quantity }) => {
        const part = byId.get(hardwareId);
        return part === undefined ? [] : [{ ...plain(part), hardwareId, quantity }];
      });
      return [each.id, { ...plain(each), parts: pricedIn(each, parts) }];
    }),
  );
}

const plain = ({ name, unitPrice }: Hardware) => ({ name, unitPrice: priceText(unitPrice) });

function pricedIn(kit: Hardware, parts: Kind['parts']): Kind['parts'] {
  if (kit.priceFromParts || parts.length === 0) return parts;
  const prices = pricesInKit(priceText(kit.unitPrice), parts);
  return parts.map((part, at) => ({ ...part, unitPrice: prices[at] ?? part.unitPrice }));
}

/** A line of the pattern's hardware at today's price, a kit as its parts; none where the kind is gone. */
export function hardwareLine(
  kinds: Kinds,
  { hardwareId, perPiece, fromStep, lossPercent }: Line,
): RunHardware[] {
  const kind = kinds.get(hardwareId);
  if (kind === undefined) return [];
  const { name, unitPrice, parts } = kind;
  const line = { perPiece, fromStep, lossPercent };
  if (parts.length === 0) return [{ ...line, hardwareId, name, unitPrice }];
  return parts.map(({ quantity, ...part }) => ({
    ...line,
    ...part,
    perPiece: perPiece * quantity,
  }));
}

/** The options that a pattern has, each with all the hardware that a piece then takes. */
export function optionsOf(
  definition: PatternDefinition,
  kinds: Kinds,
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
