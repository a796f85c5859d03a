import { Decimal } from 'decimal.js';
import { stockLayers, type StockLayer } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { scaled, unscaled } from '../../db/columns/scaled-decimal.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Lot } from '../lots/lot.entity.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { keysOf, type StockItem } from './stock-item.ts';

/** What has to be known of an item to say what a change of it is worth. */
export interface ValueFacts {
  /** By the ledger. */
  onHand: number;
  value: Decimal;
  /** What is left of each receipt, oldest first; undefined where the item is not valued first in, first out. */
  layers: StockLayer[] | undefined;
  /** What one unit of the ledger cost when it was bought; read where nothing is on hand. */
  unitCost: Decimal;
}

interface Asked {
  lots: string;
  hardware: string;
}

/** Reads that of any number of items at once; a sheet of hundreds asks no more often than one of two. */
export async function readValueFacts(
  em: EntityManager,
  items: readonly StockItem[],
): Promise<(item: StockItem) => ValueFacts> {
  if (items.length === 0) return () => nothing;
  const keys = items.map(keysOf);
  const lotIds = keys.flatMap(({ lotId }) => lotId ?? []);
  const hardwareIds = keys.flatMap(({ hardwareId }) => hardwareId ?? []);
  const asked = { lots: JSON.stringify(lotIds), hardware: JSON.stringify(hardwareIds) };
  const held = await readHeld(em, asked);
  const layers = await readLayers(em, asked);
  const gone = keys.filter((key) => (held.get(keyOf(key))?.onHand ?? 0) <= 0);
  const costs = await readUnitCosts(em, gone);
  return (item) => {
    const key = keyOf(keysOf(item));
    return {
      ...(held.get(key) ?? nothing),
      layers: typeof item.hardwareId === 'number' ? layers?.(item.hardwareId) : undefined,
      unitCost: costs.get(key) ?? nothing.unitCost,
    };
  };
}

const nothing: ValueFacts = {
  onHand: 0,
  value: new Decimal(0),
  layers: undefined,
  unitCost: new Decimal(0),
};

const keyOf = ({ lotId, hardwareId }: ReturnType<typeof keysOf>): string =>
  lotId === null ? `hardware ${hardwareId}` : `lot ${lotId}`;

interface HeldRow {
  lot_id: number | null;
  hardware_id: number | null;
  quantity: number;
  value: number;
}

async function readHeld(em: EntityManager, { lots, hardware }: Asked) {
  const rows = await em.execute<HeldRow[]>(
    `SELECT lot_id, hardware_id, SUM(quantity) AS quantity, SUM(value) AS value FROM stock_movement
     WHERE lot_id IN (SELECT value FROM json_each(?)) OR hardware_id IN (SELECT value FROM json_each(?))
     GROUP BY lot_id, hardware_id`,
    [lots, hardware],
  );
  return new Map(
    rows.map(({ lot_id: lotId, hardware_id: hardwareId, quantity, value }) => [
      keyOf({ lotId, hardwareId }),
      { onHand: quantity, value: unscaled(value, 2) },
    ]),
  );
}

interface LayerRow extends StockLayer {
  hardware_id: number;
  undoes: number;
}

/** What is left of each receipt since first in, first out began; what was there before is the first. */
async function readLayers(em: EntityManager, { hardware }: Asked) {
  const workshop = await em.findOne(Workshop, 1);
  if (workshop?.stockValue !== 'first in first out' || hardware === '[]') return undefined;
  const after = workshop.stockValueAfter;
  const rows = await em.execute<LayerRow[]>(
    `SELECT * FROM (
       SELECT hardware_id, 0 AS id, SUM(quantity) AS quantity, SUM(value) AS value, 0 AS undoes FROM stock_movement
         WHERE hardware_id IN (SELECT value FROM json_each(?)) AND id <= ? GROUP BY hardware_id
       UNION ALL
       SELECT hardware_id, id, quantity, value, kind = 'receive' AND quantity < 0 FROM stock_movement
         WHERE hardware_id IN (SELECT value FROM json_each(?)) AND id > ?)
     WHERE quantity <> 0 ORDER BY hardware_id, id`,
    [hardware, after, hardware, after],
  );
  const byItem = new Map<number, LayerRow[]>();
  for (const row of rows) {
    const ofItem = byItem.get(row.hardware_id);
    if (ofItem === undefined) byItem.set(row.hardware_id, [row]);
    else ofItem.push(row);
  }
  return (hardwareId: number) =>
    stockLayers(
      (byItem.get(hardwareId) ?? []).map((row) => ({ ...row, undoes: row.undoes === 1 })),
    );
}

async function readUnitCosts(em: EntityManager, keys: readonly ReturnType<typeof keysOf>[]) {
  const lotIds = keys.flatMap(({ lotId }) => lotId ?? []);
  const hardwareIds = keys.flatMap(({ hardwareId }) => hardwareId ?? []);
  const lots = lotIds.length === 0 ? [] : await em.find(Lot, { id: { $in: lotIds } });
  const hardware =
    hardwareIds.length === 0 ? [] : await em.find(Hardware, { id: { $in: hardwareIds } });
  return new Map<string, Decimal>([
    ...lots.map(
      ({ id, cost, measuredAreaMm2 }) =>
        [`lot ${id}`, cost.dividedBy(scaled(measuredAreaMm2, 3))] as const,
    ),
    ...hardware.map(({ id, unitPrice }) => [`hardware ${id}`, unitPrice] as const),
  ]);
}
