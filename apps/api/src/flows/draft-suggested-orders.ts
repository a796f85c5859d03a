import type { BodyOf, draftSuggested } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { invalid } from '../http/problem.ts';
import type { Work } from '../work.ts';
import type { MoreOf } from './order-suggestions/merged-line.ts';
import { putOnDraft } from './order-suggestions/put-on-draft.ts';
import { suggestOrders, type Suggested } from './order-suggestions/suggest-orders.ts';

type AskedLine = BodyOf<typeof draftSuggested>['lines'][number];

interface Wanted {
  item: Suggested;
  asked: AskedLine;
}

interface Drafted {
  orderIds: number[];
  notes: string[];
}

/**
 * Puts what is asked for on the newest draft to its supplier, or on a new one: one draft for each supplier, and one
 * line for each thing. What came on a draft since it was looked at is left alone.
 * @throws {Problem} 422 for a thing that is not bought, or parts of a piece
 */
export async function draftSuggestedOrders(
  work: Work,
  lines: readonly AskedLine[],
): Promise<Drafted> {
  const { items, workshop } = await suggestOrders(work);
  const wanted = lines.map((asked, at) => ({ item: itemFor(items, asked, at), asked }));
  const notes = wanted.flatMap(noteOn);
  const able = wanted.filter((each) => noteOn(each).length === 0);
  const orderIds: number[] = [];
  for (const supplierId of new Set(able.map(({ item }) => item.sold.supplier?.id ?? 0))) {
    const own = able.filter(({ item }) => item.sold.supplier?.id === supplierId);
    const things = own.map(moreOf);
    const put = await putOnDraft(work, { supplierId, things, areaUnit: workshop.areaUnit });
    orderIds.push(put.order.id);
    notes.push(...put.notes);
  }
  return { orderIds, notes };
}

function itemFor(items: readonly Suggested[], asked: AskedLine, at: number): Suggested {
  const field = `lines.${at}.id`;
  const item = items.find(({ row }) => row.of === asked.of && row.id === asked.id);
  if (item === undefined) {
    throw invalid([{ field, message: 'Choose something that the shop buys.' }]);
  }
  if (asked.of === 'hardware' && !Number.isInteger(Number(asked.quantity))) {
    throw invalid([{ field: `lines.${at}.quantity`, message: 'Enter whole pieces.' }]);
  }
  return item;
}

function noteOn({ item, asked }: Wanted): string[] {
  const { name } = item.row;
  if (item.sold.supplier === null) {
    return [`${name} has no supplier. Say who sells it, then draft again.`];
  }
  if (new Decimal(asked.drafted).equals(item.amounts.drafted)) return [];
  const drafts = item.open.drafts.map(({ number }) => number).join(' and ');
  return [
    drafts === ''
      ? `${name} is on a draft no more. Look at it again, then draft.`
      : `${name} is on draft ${drafts} by now. Look at it again before you draft more.`,
  ];
}

const moreOf = ({ item: { row, sold }, asked }: Wanted): MoreOf => ({
  ...{ of: row.of, id: row.id, name: row.name, unit: row.unit },
  terms: sold.terms,
  more: asked.quantity,
});
