import type { EntityManager } from '@mikro-orm/sqlite';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { freeOf } from '../../modules/stock/stock-ledger.ts';

export interface NeededHardware {
  hardwareId: number;
  name: string;
  packSize: number;
  needed: number;
  free: number;
}

/** Each kind of hardware that a run needs, with what is free of it. */
export async function hardwareForCheck(
  em: EntityManager,
  asked: readonly { hardwareId: number; quantity: number }[],
): Promise<NeededHardware[]> {
  const needed: NeededHardware[] = [];
  for (const { hardwareId, quantity } of asked) {
    const { name, packSize } = await em.findOneOrFail(Hardware, hardwareId);
    const { free } = await freeOf(em, { hardwareId });
    needed.push({ hardwareId, name, packSize, needed: quantity, free });
  }
  return needed;
}

/** What to do where a kind is short. */
export function buyMore({ needed, free, packSize }: NeededHardware): string {
  const missing = needed - free;
  if (packSize <= 1) return `Buy ${missing}, or receive them if they are here.`;
  const packs = Math.ceil(missing / packSize);
  return `Buy ${packs} ${packs === 1 ? 'pack' : 'packs'} of ${packSize}, or receive them if they are here.`;
}
