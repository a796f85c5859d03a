import { Decimal } from 'decimal.js';
import type { ServiceLineTyped } from '@hidewright/contract';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { Lot } from '../lots/lot.entity.ts';
import { describeItem } from '../stock/described-item.ts';
import { holdersOf } from '../stock/holders-of.ts';
import { freeOf } from '../stock/stock-ledger.ts';

/** What lines further up the same order send out already, by lot. */
export type GoesOut = Map<number, number>;

/**
 * A service as its table keeps it; where no area is typed, all of the lot that is free goes out.
 * @throws {Problem} 422 beside the field when there is no such lot or leather, or less of the lot is free
 */
export async function keepService(
  work: Work,
  typed: ServiceLineTyped,
  { field, goesOut }: { field: string; goesOut: GoesOut },
) {
  const lot = await work.em.findOne(Lot, typed.lotId);
  if (lot === null) throw fault(`${field}.lotId`, 'Choose a lot from the list.');
  if ((await work.em.findOne(Leather, typed.becomesLeatherId)) === null)
    throw fault(`${field}.becomesLeatherId`, 'Choose a leather from the list.');
  const quantity = await areaOf(work, lot, typed, { field, goesOut });
  goesOut.set(lot.id, (goesOut.get(lot.id) ?? 0) + quantity);
  return {
    leatherId: typed.becomesLeatherId,
    hardwareId: null,
    service: typed.service,
    fromLotId: lot.id,
    quantity,
    unitPrice: new Decimal(typed.unitPrice ?? 0),
    fixedPrice: typeof typed.fixedPrice === 'string' ? new Decimal(typed.fixedPrice) : null,
  };
}

async function areaOf(
  work: Work,
  lot: Lot,
  { areaMm2 }: ServiceLineTyped,
  { field, goesOut }: { field: string; goesOut: GoesOut },
): Promise<number> {
  const { say } = await describeItem(work.em, { lotId: lot.id });
  const { free } = await freeOf(work.em, { lotId: lot.id });
  const left = free - (goesOut.get(lot.id) ?? 0);
  if (left <= 0) {
    const holders = await holdersOf(work.em, { lotId: lot.id });
    const held = holders.length === 0 ? '' : ` ${holders.join(', ')} is held.`;
    throw fault(`${field}.lotId`, `Nothing of ${lot.tag} is free.${held} Choose another lot.`);
  }
  const quantity = typeof areaMm2 === 'string' ? scaled(new Decimal(areaMm2), 3) : left;
  if (quantity <= left) return quantity;
  throw fault(`${field}.areaMm2`, `Of ${lot.tag} ${say(left)} is free. Enter at most that.`);
}

const fault = (field: string, message: string) => invalid([{ field, message }]);
