import type { EntityManager } from '@mikro-orm/sqlite';
import type { HardwareLevel, KitLevel, LeatherLevel, StockLevels } from '@hidewright/contract';
import { wholeKits } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { readKits } from '../hardware/kit-counts.ts';
import { readOutAt } from './out-at.ts';
import type { Standings } from './standings.ts';

interface Asked {
  /** The day whose end is meant. */
  on: string;
  /** How all stood then. */
  standings: Standings;
  hardwareId?: number | undefined;
  leatherId?: number | undefined;
}

interface LotRow {
  lot_id: number;
  tag: string;
  form: string;
  place: string;
  leather_id: number;
  quantity: number;
  value: number;
}

interface HardwareRow {
  id: number;
  name: string;
  kind: HardwareLevel['kind'];
  unit: HardwareLevel['unit'];
  quantity: number;
  value: number;
}

/** What the ledger says was there at the end of a day, and what it was worth; the place of a lot is where it lies now. */
export async function readLevels(em: EntityManager, asked: Asked): Promise<StockLevels> {
  const { on, standings } = asked;
  const lots = asked.hardwareId === undefined ? await readLotRows(em, asked) : [];
  const pieces = asked.leatherId === undefined ? await readHardwareRows(em, asked) : [];
  const out = asked.hardwareId === undefined ? await readOutAt(em, asked) : [];
  const [leatherValue, hardwareValue] = [sumOf(lots, 'value'), sumOf(pieces, 'value')];
  return {
    on,
    leathers: await readLeathers(em, asked, { lots, standings }),
    hardware: pieces.map((row) => ({
      hardwareId: row.id,
      name: row.name,
      kind: row.kind,
      unit: row.unit,
      quantity: row.quantity,
      value: money(row.value),
      standing: standings.ofHardware(row.id),
    })),
    kits: isOfAll(asked) ? await readKitLevels(em, pieces) : [],
    leatherAreaMm2: area(sumOf(lots, 'quantity')),
    leatherValue: money(leatherValue),
    hardwareValue: money(hardwareValue),
    out: out.map((row) => ({
      lotId: row.lot_id,
      tag: row.tag,
      leatherName: row.leather_name,
      service: row.service,
      supplierName: row.supplier_name,
      purchaseOrderNumber: row.number,
      areaMm2: area(row.quantity),
      value: money(row.value),
    })),
    outAreaMm2: area(sumOf(out, 'quantity')),
    outValue: money(sumOf(out, 'value')),
    value: money(leatherValue + hardwareValue),
  };
}

const isOfAll = ({ hardwareId, leatherId }: Asked): boolean =>
  hardwareId === undefined && leatherId === undefined;

/** By what was there of the parts then, as they make up a kit today. */
async function readKitLevels(
  em: EntityManager,
  pieces: readonly HardwareRow[],
): Promise<KitLevel[]> {
  const there = new Map(pieces.map(({ id, quantity }) => [id, quantity]));
  return (await readKits(em)).map(({ id, name, parts }) => ({
    ...{ hardwareId: id, name },
    quantity: wholeKits(
      parts.map(({ hardwareId, quantity }) => ({ quantity, there: there.get(hardwareId) ?? 0 })),
    ),
    parts: parts.map((part) => ({ name: part.name, quantity: part.quantity })),
  }));
}

const money = (hundredths: number): string => moneyText(unscaled(hundredths, 2));
const area = (thousandths: number): string => unscaled(thousandths, 3).toFixed();

const sumOf = (rows: readonly { quantity: number; value: number }[], of: 'quantity' | 'value') =>
  rows.reduce((sum, row) => sum + row[of], 0);

function readLotRows(em: EntityManager, { on, leatherId }: Asked): Promise<LotRow[]> {
  const { where, values } = whereAll([
    { sql: 'm.day <= ?', values: [on] },
    ...when(leatherId, 'lot.leather_id = ?'),
  ]);
  return em.execute(
    `SELECT lot.id AS lot_id, lot.tag, lot.form, lot.place, lot.leather_id,
       SUM(m.quantity) AS quantity, SUM(m.value) AS value
     FROM stock_movement m JOIN lot ON lot.id = m.lot_id
     ${where} GROUP BY lot.id HAVING SUM(m.quantity) <> 0 ORDER BY lot.tag`,
    values,
  );
}

/** What is used up stays in the list: a nought is an answer too. A kit has none of its own to be used up. */
function readHardwareRows(em: EntityManager, { on, hardwareId }: Asked): Promise<HardwareRow[]> {
  const { where, values } = whereAll(when(hardwareId, 'h.id = ?'));
  return em.execute(
    `SELECT h.id, h.name, h.kind, h.unit, COALESCE(SUM(m.quantity), 0) AS quantity, COALESCE(SUM(m.value), 0) AS value
     FROM hardware h LEFT JOIN stock_movement m ON m.hardware_id = h.id AND m.day <= ?
     ${where} GROUP BY h.id
     HAVING COALESCE(SUM(m.quantity), 0) <> 0
       OR (h.active = 1 AND h.id NOT IN (SELECT kit_id FROM kit_part))
     ORDER BY h.kind, h.name`,
    [on, ...values],
  );
}

/** Leather that hangs there, or of which some is on order or promised: a nought is an answer too. */
async function readLeathers(
  em: EntityManager,
  { hardwareId, leatherId }: Asked,
  { lots, standings }: { lots: readonly LotRow[]; standings: Standings },
): Promise<LeatherLevel[]> {
  if (hardwareId !== undefined) return [];
  const { where, values } = whereAll(when(leatherId, 'leather.id = ?'));
  const kinds = await em.execute<{ id: number; name: string }[]>(
    `SELECT id, name FROM leather ${where} ORDER BY name`,
    values,
  );
  return kinds.flatMap(({ id, name }) => {
    const own = lots.filter((row) => row.leather_id === id);
    const standing = standings.ofLeather(id);
    if (own.length === 0 && standing.onOrder === '0' && standing.promised === '0') return [];
    return [
      {
        ...{ leatherId: id, name, standing },
        areaMm2: area(sumOf(own, 'quantity')),
        value: money(sumOf(own, 'value')),
        lots: own.map((row) => ({
          lotId: row.lot_id,
          tag: row.tag,
          form: row.form,
          place: row.place,
          areaMm2: area(row.quantity),
          value: money(row.value),
        })),
      },
    ];
  });
}
