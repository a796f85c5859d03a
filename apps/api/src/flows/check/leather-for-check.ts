import { soundAreaMm2, type DrawnSide, type LeatherStock } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled, unscaledText } from '../../db/columns/scaled-decimal.ts';
import { Lot } from '../../modules/lots/lot.entity.ts';
import { StockBalance } from '../../modules/stock/stock-balance.entity.ts';

interface FreeLot {
  lotId: number;
  tag: string;
  place: string;
  receivedOn: string;
  freeAreaMm2: string;
}

/** The lots of a leather that still have something free. */
export async function freeLotsOf(em: EntityManager, leatherId: number): Promise<FreeLot[]> {
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

export interface LotRow {
  id: number;
  tag: string;
  leather_id: number;
  place: string;
  shade: string;
  received_on: string;
  form: Lot['form'];
  pieces: number;
  measured_area_mm2: number;
  usable_percent: number;
  width_mm: number | null;
  height_mm: number | null;
  outline: string | null;
  flaws: string;
  weight_oz: number | null;
  free: number;
}

/** Every lot of some leathers that has something free, oldest number first. */
export function freeLotRows(em: EntityManager, leatherIds: readonly number[]): Promise<LotRow[]> {
  return em.execute<LotRow[]>(
    `SELECT l.id, l.tag, l.leather_id, l.place, l.shade, l.received_on, l.form, l.pieces, l.measured_area_mm2,
      l.usable_percent, l.width_mm, l.height_mm, l.outline, l.flaws, l.weight_oz,
      b.on_hand - b.reserved AS free
    FROM lot l JOIN stock_balance b ON b.lot_id = l.id
    WHERE l.leather_id IN (SELECT value FROM json_each(?)) AND b.on_hand > b.reserved ORDER BY l.id`,
    [JSON.stringify(leatherIds)],
  );
}

export function toRackLot(row: LotRow): LeatherStock['lots'][number] {
  return {
    lotId: row.id,
    tag: row.tag,
    place: row.place,
    shade: row.shade,
    weightOz: unscaledText(row.weight_oz, 3),
    receivedOn: row.received_on,
    freeArea: row.free,
    measuredArea: row.measured_area_mm2,
    usablePercent: row.usable_percent / 10_000,
    panel: panelOf(row),
    ...(row.form === 'offcut' ? { offcuts: row.pieces } : { panels: row.pieces }),
    drawnArea: drawnArea(row),
  };
}

const withSides: ReadonlySet<Lot['form']> = new Set(['panel', 'strip', 'offcut']);

/** Ready panels and strips have straight sides, and an offcut lies within its own; a whole side has none to go by. */
function panelOf({ form, width_mm, height_mm }: LotRow) {
  if (!withSides.has(form) || width_mm === null || height_mm === null) return null;
  return {
    widthMm: unscaled(width_mm, 6).toNumber(),
    heightMm: unscaled(height_mm, 6).toNumber(),
  };
}

function drawnArea({ outline, flaws }: LotRow): number | null {
  if (outline === null) return null;
  const drawn = { outline: JSON.parse(outline), flaws: JSON.parse(flaws) } as DrawnSide;
  return Math.floor(soundAreaMm2(drawn) * 1000);
}
