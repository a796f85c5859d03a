import type { FreeLot } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Lot } from '../../modules/lots/lot.entity.ts';
import { StockBalance } from '../../modules/stock/stock-balance.entity.ts';

/** A lot with something free on it, and where it lies. */
export interface RackLot extends FreeLot {
  place: string;
}

/** The lots of a leather that still have something free. */
export async function freeLotsOf(em: EntityManager, leatherId: number): Promise<RackLot[]> {
  const lots = await em.find(Lot, { leatherId }, { orderBy: { id: 'asc' } });
  const balances = await em.find(StockBalance, { lotId: { $in: lots.map(({ id }) => id) } });
  return lots.flatMap(({ id, tag, place, receivedOn }) => {
    const balance = balances.find(({ lotId }) => lotId === id);
    const free = balance === undefined ? 0 : balance.onHand - balance.reserved;
    return free > 0
      ? [{ lotId: id, tag, place, receivedOn, freeAreaMm2: unscaled(free, 3).toString() }]
      : [];
  });
}
