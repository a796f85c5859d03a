import type { PatternDefinition } from '@hidewright/contract';
import { pricesInKit, type RunHardware } from '@hidewright/domain';
import { priceText } from '../http/decimal-text.ts';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import { kindsWithParts, partsAmong, type WithParts } from '../modules/hardware/kits.ts';
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
  const columns = ['name', 'unit_price', 'price_from_parts', 'from_customer'];
  const rows = await kindsWithParts<PricedRow>(em, ids, columns);
  const plain = (row: PricedRow) => ({
    name: row.name,
    // What the customer brings costs nothing, whatever it once cost.
    unitPrice: priceText(unscaled(row.from_customer === 1 ? 0 : row.unit_price, 4)),
  });
  const byId = new Map(rows.map((row) => [row.id, row]));
  return new Map(
    rows.map((row) => {
      const parts = partsAmong(row, byId).map(({ part, quantity }) => ({
        ...plain(part),
        hardwareId: part.id,
        quantity,
      }));
      return [row.id, { ...plain(row), parts: pricedIn(row, plain(row).unitPrice, parts) }];
    }),
  );
}

interface PricedRow extends WithParts {
  name: string;
  unit_price: number;
  price_from_parts: number;
  from_customer: number;
}

function pricedIn(
  { price_from_parts }: PricedRow,
  unitPrice: string,
  parts: Kind['parts'],
): Kind['parts'] {
  if (price_from_parts === 1 || parts.length === 0) return parts;
  const prices = pricesInKit(unitPrice, parts);
  return parts.map((part, at) => ({ ...part, unitPrice: prices[at] ?? part.unitPrice }));
}

/** A line of the pattern's hardware at today's price, a kit as its parts; none where the kind is gone. */
export function hardwareLine(
  kinds: Kinds,
  { hardwareId, perPiece, per, fromStep, lossPercent }: Line,
): RunHardware[] {
  const kind = kinds.get(hardwareId);
  if (kind === undefined) return [];
  const { name, unitPrice, parts } = kind;
  const line = { perPiece, per, fromStep, lossPercent };
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
  return (definition.options ?? []).map(({ name }) => ({
    name,
    hardware: linesWith(definition, name).flatMap((line) => hardwareLine(kinds, line)),
  }));
}

/** The lines of hardware that a piece takes with an option of the pattern, or as it is. */
export function linesWith(
  { hardware, options = [] }: PatternDefinition,
  name: string | null,
): Line[] {
  const swaps = options.find((option) => option.name === name)?.swaps ?? [];
  const out = new Set(swaps.map(({ hardwareId }) => hardwareId));
  const stays = hardware.filter(({ hardwareId }) => !out.has(hardwareId));
  const comes = swaps.flatMap(({ hardwareId, byHardwareId, perPiece, fromStep }) => {
    if (byHardwareId === null) return [];
    // What takes a line's place is counted as that was; what is added says its step itself.
    const as = hardware.find((line) => line.hardwareId === hardwareId) ?? { fromStep };
    return [{ ...as, hardwareId: byHardwareId, perPiece }];
  });
  return [...stays, ...comes];
}
