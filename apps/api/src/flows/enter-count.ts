import { Decimal } from 'decimal.js';
import type { BodyOf, enterCount as endpoint } from '@hidewright/contract';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { invalid } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { CountLine } from '../modules/counts/count-line.entity.ts';
import { findCount, findCountLine, requireCountState } from '../modules/counts/find-count.ts';
import type { StockCount } from '../modules/counts/stock-count.entity.ts';
import { findScanned } from '../modules/scans/find-scanned.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { itemOf, keysOf, type StockItem } from '../modules/stock/stock-item.ts';
import { onHandAt } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';

type Entry = BodyOf<typeof endpoint>;

/**
 * Writes down what was counted of a line, and what the books said at that moment. Whoever writes last stands.
 * @returns who had written what there, where that was somebody else
 * @throws {Problem} 404, 409 when the sheet is not open, 422
 */
export async function enterCount(
  work: Work,
  { id, lineId }: { id: number; lineId: number },
  entry: Entry,
): Promise<string | null> {
  const sheet = await findCount(work.em, id);
  requireCountState(sheet, 'open');
  const line = await findCountLine(work.em, id, lineId);
  const counted = countedOf(line, entry);
  const item = itemOf(line);
  const { name, say } = await describeItem(work.em, item);
  const replaced = replacedBy(work, line, say);
  const at = momentOf(work, sheet, entry.secondsAgo);
  line.counted = counted;
  line.book = counted === null ? null : await onHandAt(work.em, item, at);
  line.unmeasured = entry.unmeasured === true;
  line.again = false;
  sign(work, line, at);
  await work.em.flush();
  await logDeed(work, {
    action: `${didWhat(line, say)} ${name} on the count sheet ${sheet.title}`,
    subjectKind: 'count',
    subjectId: sheet.id,
    detail: { line: line.id },
  });
  return replaced;
}

function countedOf({ lotId }: CountLine, { areaMm2, quantity, unmeasured }: Entry): number | null {
  if (lotId === null && (areaMm2 !== undefined || unmeasured === true)) {
    throw invalid([
      {
        field: 'quantity',
        message: 'Enter how many there are, as a whole number; 0 when there are none.',
      },
    ]);
  }
  if (lotId !== null && quantity !== undefined) {
    throw invalid([{ field: 'areaMm2', message: 'Enter the area that is there.' }]);
  }
  return areaMm2 === undefined ? (quantity ?? null) : scaled(new Decimal(areaMm2), 3);
}

/** When it was counted: it may have waited on a phone, but never since before the sheet was opened. */
function momentOf(work: Work, sheet: StockCount, secondsAgo: number): string {
  const at = new Date(work.now.getTime() - secondsAgo * 1000).toISOString();
  return at < sheet.openedAt ? sheet.openedAt : at;
}

function sign(work: Work, line: CountLine, at: string): void {
  const written = line.counted !== null || line.unmeasured;
  line.countedAt = written ? at : null;
  line.countedById = written ? work.actor.id : null;
  line.countedByName = written ? work.actor.name : null;
}

function replacedBy(work: Work, line: CountLine, say: (quantity: number) => string): string | null {
  if (line.countedAt === null || line.again || line.countedById === work.actor.id) return null;
  const had = line.counted === null ? 'seen it hang there' : `${say(line.counted)} there`;
  return `${line.countedByName ?? 'Somebody'} had ${had}; what you wrote stands now.`;
}

function didWhat(line: CountLine, say: (quantity: number) => string): string {
  if (line.unmeasured) return 'saw';
  return line.counted === null ? 'took back the count of' : `counted ${say(line.counted)} of`;
}

/**
 * Puts on the sheet what was found there, by its tag; what stands on it already stays there once.
 * @throws {Problem} 404 when it is no tag, 409, 422 when it is the tag of something that is not counted
 */
export async function addToCount(
  work: Work,
  id: number,
  code: string,
): Promise<{ lineId: number; already: boolean }> {
  const sheet = await findCount(work.em, id);
  requireCountState(sheet, 'open');
  const scanned = await findScanned(work.em, code);
  const item: StockItem | undefined =
    scanned.kind === 'lot'
      ? { lotId: scanned.id }
      : scanned.kind === 'hardware'
        ? { hardwareId: scanned.id }
        : undefined;
  if (item === undefined) {
    const message = `${scanned.tag} is no lot and no bin. Scan the tag of leather or of a bin.`;
    throw invalid([{ field: 'code', message }]);
  }
  const there = await work.em.findOne(CountLine, { ...keysOf(item), countId: id });
  if (there !== null) return { lineId: there.id, already: true };
  const line = work.em.create(CountLine, {
    ...keysOf(item),
    countId: id,
    added: true,
    unmeasured: false,
    again: false,
  });
  await work.em.flush();
  await logDeed(work, {
    action: `found ${scanned.tag} and put it on the count sheet ${sheet.title}`,
    subjectKind: 'count',
    subjectId: id,
  });
  return { lineId: line.id, already: false };
}
