import type { JobLot } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Lot } from '../../modules/lots/lot.entity.ts';
import { Reservation } from '../../modules/stock/reservation.entity.ts';
import { StockBalance } from '../../modules/stock/stock-balance.entity.ts';
import { StockMovement } from '../../modules/stock/stock-movement.entity.ts';
import type { SetLine } from '../set-hardware.ts';
import { misfitsWith } from './lot-misfits.ts';
import { mixesOf } from './lot-mixes.ts';

type Keyed = { lotId: number | null; hardwareId: number | null };

/** What a job holds and has taken, by what it is about. */
export interface JobStock {
  held(item: Partial<Keyed>): number;
  taken(item: Partial<Keyed>): number;
  rows: Keyed[];
}

export async function stockOfJob(em: EntityManager, jobId: number): Promise<JobStock> {
  const reservations = await em.find(Reservation, { jobId });
  const moved = (await em.find(StockMovement, { jobId })).map(
    ({ lotId, fromLotId, hardwareId, quantity }) => ({
      // An offcut came out of what was taken of the lot that it was cut from.
      lotId: fromLotId ?? lotId,
      hardwareId,
      quantity,
    }),
  );
  return {
    held: (item) => sum(reservations.filter(same(item)).map(({ open }) => open)),
    taken: (item) => -sum(moved.filter(same(item)).map(({ quantity }) => quantity)),
    rows: [...reservations, ...moved],
  };
}

const sum = (numbers: number[]): number => numbers.reduce((total, each) => total + each, 0);

function same(item: Partial<Keyed>): (row: Keyed) => boolean {
  const { lotId = null, hardwareId = null } = item;
  return (row) => row.lotId === lotId && row.hardwareId === hardwareId;
}

const areaText = (quantity: number): string => unscaled(quantity, 3).toString();

/** The lots that the job holds or has taken from, and those of its leather that still have something free. */
export async function ticketLots(
  em: EntityManager,
  stock: JobStock,
  leatherId: number,
  setLines: readonly SetLine[],
): Promise<JobLot[]> {
  const own = stock.rows.flatMap(({ lotId }) => (lotId === null ? [] : [lotId]));
  const lots = await em.find(
    Lot,
    { $or: [{ leatherId }, { id: { $in: own } }] },
    { orderBy: { id: 'asc' } },
  );
  const balances = await balancesByItem(em, { lotId: { $in: lots.map(({ id }) => id) } });
  const rows = lots
    .map((lot) => ({
      lotId: lot.id,
      tag: lot.tag,
      form: lot.form,
      shade: lot.shade,
      place: lot.place,
      widthMm: lot.widthMm?.toString() ?? null,
      heightMm: lot.heightMm?.toString() ?? null,
      held: stock.held({ lotId: lot.id }),
      ...(balances.get(`lot ${lot.id}`) ?? nothingThere),
      taken: stock.taken({ lotId: lot.id }),
      misfits: misfitsWith(lot, setLines),
    }))
    .filter(({ held, free, taken }) => held > 0 || free > 0 || taken > 0)
    .sort((a, b) => b.held - a.held || b.taken - a.taken);
  const mixes = await mixesOf(em, rows);
  return rows.map(({ held, onHand, missing, free, taken, ...lot }) => ({
    ...lot,
    heldAreaMm2: areaText(held),
    onHandAreaMm2: areaText(onHand),
    missingAreaMm2: areaText(missing),
    freeAreaMm2: areaText(free),
    takenAreaMm2: areaText(taken),
    mix: mixes.get(lot.lotId) ?? null,
  }));
}

type Which = { lotId: { $in: number[] } } | { hardwareId: { $in: number[] } };

interface Balance {
  onHand: number;
  /** On hand and held for nobody. */
  free: number;
  /** Held and not there. */
  missing: number;
}

export const nothingThere: Balance = { onHand: 0, free: 0, missing: 0 };

/** What there is of each, by `lot 7` or `hardware 3`. */
export async function balancesByItem(
  em: EntityManager,
  which: Which,
): Promise<Map<string, Balance>> {
  const balances = await em.find(StockBalance, which);
  return new Map(
    balances.map(({ lotId, hardwareId, onHand, reserved }) => [
      lotId === null ? `hardware ${hardwareId}` : `lot ${lotId}`,
      { onHand, free: Math.max(0, onHand - reserved), missing: Math.max(0, reserved - onHand) },
    ]),
  );
}
