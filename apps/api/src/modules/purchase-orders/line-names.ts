import type { EntityManager } from '@mikro-orm/sqlite';
import type { PurchasedService } from '@hidewright/contract';
import { type Wholes, wholesOf } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { Lot } from '../lots/lot.entity.ts';
import type { PurchaseLine } from './purchase-line.entity.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';
import { sayService } from './service-words.ts';

/** Everything that lines name, by its id. */
export interface LineNames {
  leathers: Map<number, Leather>;
  hardware: Map<number, Hardware>;
  lots: Map<number, Lot>;
}

export async function readLineNames(em: EntityManager, lines: PurchaseLine[]): Promise<LineNames> {
  const ids = (of: 'leatherId' | 'hardwareId' | 'fromLotId') =>
    lines.flatMap((line) => line[of] ?? []);
  const lots = await byId(em.find(Lot, { id: ids('fromLotId') }));
  const before = [...lots.values()].map(({ leatherId }) => leatherId);
  return {
    leathers: await byId(em.find(Leather, { id: [...ids('leatherId'), ...before] })),
    hardware: await byId(em.find(Hardware, { id: ids('hardwareId') })),
    lots,
  };
}

async function byId<T extends { id: number }>(rows: Promise<T[]>): Promise<Map<number, T>> {
  return new Map((await rows).map((row) => [row.id, row]));
}

/** What a line is called wherever it is shown. */
export function nameOf(line: PurchaseLine, { leathers, hardware, lots }: LineNames): string {
  const lot = lots.get(line.fromLotId ?? 0);
  if (line.service !== null && lot !== undefined) {
    const leather = leathers.get(lot.leatherId)?.name ?? '';
    return sayService({ service: line.service, tag: lot.tag, leather });
  }
  return leathers.get(line.leatherId ?? 0)?.name ?? hardware.get(line.hardwareId ?? 0)?.name ?? '';
}

/** What a line has done to a lot, and how far that is; null where goods are ordered. */
export function serviceOf(
  line: PurchaseLine,
  order: PurchaseOrder,
  { leathers, lots }: LineNames,
): PurchasedService | null {
  const lot = lots.get(line.fromLotId ?? 0);
  if (line.service === null || line.leatherId === null || lot === undefined) return null;
  return {
    word: line.service,
    lotId: lot.id,
    lotTag: lot.tag,
    lotForm: lot.form,
    becomesLeatherId: line.leatherId,
    becomesName: leathers.get(line.leatherId)?.name ?? '',
    changes: line.leatherId !== lot.leatherId,
    state: stateOf(line, order),
  };
}

/** How many whole sides or hides are ordered, where they come out even; what goes out to be worked on is of one lot. */
export function wholeOf(
  { service, leatherId, quantity }: PurchaseLine,
  { leathers }: LineNames,
): Wholes | null {
  const { wholeForm: form = null, wholeAreaMm2 = null } = leathers.get(leatherId ?? 0) ?? {};
  if (service !== null || form === null || wholeAreaMm2 === null) return null;
  return wholesOf({ form, areaMm2: wholeAreaMm2.toFixed() }, unscaled(quantity, 3).toFixed());
}

function stateOf({ received, closed }: PurchaseLine, order: PurchaseOrder) {
  if (received > 0) return 'came back';
  if (order.sentAt === null) return 'to go out';
  const awaited = order.state === 'sent' || order.state === 'part received';
  return awaited && !closed ? 'out' : 'put back';
}
