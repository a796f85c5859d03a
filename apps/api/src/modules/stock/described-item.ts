import { countedWords } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { notFound } from '../../http/problem.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Lot } from '../lots/lot.entity.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { sayArea } from './say-area.ts';
import type { StockItem } from './stock-item.ts';

interface DescribedItem {
  /** As people name it: "lot T-0012", "Copper rivet 9 mm". */
  name: string;
  /** What one unit of the ledger cost when it was bought, in whole currency units. */
  unitCost: Decimal;
  /** A quantity of the ledger in words: "12.4 ft²", "600", "250 ml". */
  say(quantity: number): string;
}

/** @throws {Problem} 404 when there is no such lot or hardware */
export async function describeItem(em: EntityManager, item: StockItem): Promise<DescribedItem> {
  return typeof item.lotId === 'number'
    ? describeLot(em, item.lotId)
    : describeHardware(em, item.hardwareId);
}

async function describeLot(em: EntityManager, id: number): Promise<DescribedItem> {
  const lot = await em.findOne(Lot, id);
  if (lot === null) throw notFound('lot');
  const workshop = await em.findOne(Workshop, 1);
  return {
    name: `lot ${lot.tag}`,
    unitCost: lot.cost.dividedBy(scaled(lot.measuredAreaMm2, 3)),
    say: (quantity) => sayArea(new Decimal(quantity).dividedBy(1000), workshop?.areaUnit ?? 'ft2'),
  };
}

async function describeHardware(em: EntityManager, id: number): Promise<DescribedItem> {
  const hardware = await em.findOne(Hardware, id);
  if (hardware === null) throw notFound('hardware');
  const { name, unitPrice, unit } = hardware;
  return { name, unitCost: unitPrice, say: (quantity) => countedWords(quantity, unit) };
}
