import {
  comingStock,
  dailyUse,
  itemUse,
  MM2_PER_FT2,
  orderSuggestion,
  type ComingStock,
  type Dated,
  type ItemUse,
  type OrderSuggestion,
} from '@hidewright/domain';
import { readKits, type Kit } from '../../modules/hardware/kit-counts.ts';
import { Workshop } from '../../modules/workshop/workshop.entity.ts';
import type { Work } from '../../work.ts';
import { readOwedByStart } from '../check/owed-by-start.ts';
import type { OwedToJobs } from '../check/owed-to-jobs.ts';
import { readItemSources, type ItemSource } from './item-sources.ts';
import { readOpenLines, type OpenLines } from './open-lines.ts';
import { readOrderedItems, type ItemRow } from './ordered-items.ts';
import { readUsedByWeek } from './used-by-week.ts';

/** How much there is of a thing, in pieces, or in mm². */
interface Amounts {
  onHand: number;
  reserved: number;
  free: number;
  promised: number;
  onOrder: number;
  drafted: number;
  minimum: number;
}

/** A thing with all that is known of it and what follows. */
export interface Suggested {
  row: ItemRow;
  /** Those that it is a part of. */
  kits: readonly Kit[];
  sold: ItemSource;
  use: ItemUse;
  amounts: Amounts;
  /** What jobs need beyond what they hold. */
  promised: readonly Dated[];
  open: OpenLines;
  suggestion: OrderSuggestion;
  coming: ComingStock;
}

/** A thing of which nothing can be said, such as one whose row was damaged. */
interface Unclear {
  row: ItemRow;
  error: unknown;
}

export interface Suggestions {
  items: Suggested[];
  unclear: Unclear[];
  workshop: Workshop;
  today: string;
}

interface Known {
  workshop: Workshop;
  today: string;
  sourceOf: Awaited<ReturnType<typeof readItemSources>>;
  used: Awaited<ReturnType<typeof readUsedByWeek>>;
  openLines: Awaited<ReturnType<typeof readOpenLines>>;
  owed: OwedToJobs;
  kits: readonly Kit[];
}

/**
 * What should be ordered of everything that is bought, in as many questions to the database whatever there is. A thing
 * of which it cannot be worked out is set aside: what is said of the others must not wait for it.
 */
export async function suggestOrders(work: Work): Promise<Suggestions> {
  const { em, today } = work;
  const rows = await readOrderedItems(em);
  const known: Known = {
    workshop: await em.findOneOrFail(Workshop, 1),
    today,
    sourceOf: await readItemSources(em, today),
    used: await readUsedByWeek(em, today),
    openLines: await readOpenLines(em, today),
    owed: (await readOwedByStart(work)).owed,
    kits: await readKits(em),
  };
  const [items, unclear]: [Suggested[], Unclear[]] = [[], []];
  for (const row of rows) {
    try {
      items.push(suggestFor(row, known));
    } catch (error) {
      unclear.push({ row, error });
    }
  }
  return { items, unclear, workshop: known.workshop, today };
}

/** The ledger counts leather in thousandths of mm². */
const counted = ({ of }: ItemRow, kept: number): number => (of === 'leather' ? kept / 1000 : kept);

function suggestFor(row: ItemRow, known: Known): Suggested {
  const key = `${row.of} ${row.id}`;
  const sold = known.sourceOf(row);
  const use = itemUse(known.used(key).map((kept) => counted(row, kept)));
  const open = known.openLines(key);
  const owed = row.of === 'leather' ? known.owed.leather(row.id) : known.owed.hardware(row.id);
  const [promised, receipts] = [inUnits(row, owed), inUnits(row, open.receipts)];
  const amounts = amountsOf(row, open, promised);
  const suggestion = orderSuggestion({
    ...amounts,
    ...{ use, lead: sold.lead, terms: sold.terms, ...ratesOf(known.workshop) },
    pricedAmount: row.of === 'leather' ? MM2_PER_FT2 : '1',
    byHand: byHandOf(row),
  });
  const { today } = known;
  const coming = comingStock({ ...amounts, promised, receipts, today, daily: dailyUse(use) });
  return { row, kits: kitsOf(row, known), sold, use, amounts, promised, open, suggestion, coming };
}

const kitsOf = ({ of, id }: ItemRow, { kits }: Known): Kit[] =>
  of === 'hardware'
    ? kits.filter(({ parts }) => parts.some(({ hardwareId }) => hardwareId === id))
    : [];

const inUnits = (row: ItemRow, all: readonly Dated[]): Dated[] =>
  all.map((each) => ({ ...each, quantity: counted(row, each.quantity) }));

function amountsOf(row: ItemRow, open: OpenLines, promised: readonly Dated[]): Amounts {
  return {
    onHand: counted(row, row.on_hand),
    reserved: counted(row, row.reserved),
    free: counted(row, row.free),
    promised: promised.reduce((sum, { quantity }) => sum + quantity, 0),
    onOrder: counted(row, open.onOrder),
    drafted: counted(row, open.drafted),
    minimum: counted(row, row.minimum),
  };
}

function byHandOf(row: ItemRow) {
  const { order_point: point, order_quantity: quantity } = row;
  return {
    point: point === null ? null : counted(row, point),
    quantity: quantity === null ? null : String(counted(row, quantity)),
  };
}

function ratesOf({ servicePercent, orderCost, holdingPercent }: Workshop) {
  return {
    service: servicePercent.dividedBy(100).toNumber(),
    orderCost: orderCost.toString(),
    holdingRate: holdingPercent.dividedBy(100).toNumber(),
  };
}
