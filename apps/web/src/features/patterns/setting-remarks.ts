import type { Hardware, Leather } from '@hidewright/contract';
import { kitSettingFaults } from '@hidewright/domain';

/** What the pattern's page will say of a line of hardware, while the pattern is still being typed. */
export function remarksOn(
  chosen: Hardware | undefined,
  all: readonly Hardware[],
  leather: Leather | undefined,
  layers: unknown,
): string[] {
  if (chosen === undefined) return [];
  const parts = chosen.parts.flatMap(
    ({ hardwareId }) => all.find(({ id }) => id === hardwareId) ?? [],
  );
  return kitSettingFaults(chosen, parts, {
    layers: isLayers(layers) ? layers : null,
    weightLowOz: leather?.weightLowOz ?? null,
    weightHighOz: leather?.weightHighOz ?? null,
  });
}

const isLayers = (value: unknown): value is number =>
  typeof value === 'number' && Number.isInteger(value) && value >= 1 && value <= 20;
