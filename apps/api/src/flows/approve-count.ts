import { countOutcome } from '@hidewright/domain';
import { requireVersion } from '../http/conditions.ts';
import { wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import type { CountLine } from '../modules/counts/count-line.entity.ts';
import { findCount, linesOf, requireCountState } from '../modules/counts/find-count.ts';
import type { StockCount } from '../modules/counts/stock-count.entity.ts';
import { Lot } from '../modules/lots/lot.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { itemOf } from '../modules/stock/stock-item.ts';
import { freeOf, postCount, setSince } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { settle } from './hand-in-count.ts';

/**
 * Posts the differences of a sheet as movements, and hangs where it was found what was found elsewhere.
 * @throws {Problem} 404, 409 when it is not handed in, or what happened since makes a line meaningless, 412 when it
 * was counted again after it was read
 */
export async function approveCount(
  work: Work,
  { id, ifMatch }: { id: number; ifMatch: number },
): Promise<void> {
  const sheet = await findCount(work.em, id);
  requireCountState(sheet, 'handed in');
  await requireVersion(work.em, { kind: 'count', id, version: sheet.version }, ifMatch);
  const lines = await linesOf(work.em, id);
  let posted = 0;
  for (const line of lines) {
    if (await postLine(work, sheet, line)) posted += 1;
    await moveHere(work, sheet, line);
  }
  settle(work, sheet, 'approved');
  await work.em.flush();
  await logDeed(work, {
    action: `approved the count sheet ${sheet.title}`,
    subjectKind: 'count',
    subjectId: sheet.id,
    detail: { differences: posted },
  });
}

/** Whether there was a difference to post. */
async function postLine(work: Work, sheet: StockCount, line: CountLine): Promise<boolean> {
  const { counted, book, countedAt } = line;
  if (counted === null || book === null || countedAt === null) return false;
  const item = itemOf(line);
  if (await setSince(work.em, item, countedAt)) {
    throw await meaningless(work, line, 'was counted or adjusted elsewhere after that');
  }
  const { onHand, reserved } = await freeOf(work.em, item);
  const outcome = countOutcome({ counted, bookThen: book, onHandNow: onHand, reserved });
  if (outcome.difference === 0) return false;
  if (outcome.after < 0) {
    throw await meaningless(work, line, 'has lost more since than was counted');
  }
  const movement = await postCount(work, {
    ...item,
    difference: outcome.difference,
    reason: `counted: ${sheet.title}`,
  });
  line.movementId = movement.id;
  await work.em.flush();
  return true;
}

async function meaningless(work: Work, line: CountLine, why: string) {
  const { name } = await describeItem(work.em, itemOf(line));
  return wrongState(
    `${name.charAt(0).toUpperCase()}${name.slice(1)} ${why}. Ask for it to be counted again.`,
    ['ask for a recount'],
  );
}

/** What was found on the shelf that is counted lies there from now on. */
async function moveHere(work: Work, sheet: StockCount, line: CountLine): Promise<void> {
  const there = (line.counted ?? 0) > 0 || line.unmeasured;
  if (!line.added || line.lotId === null || !there || !sheet.place) return;
  const lot = await work.em.findOneOrFail(Lot, line.lotId);
  if (lot.place === sheet.place) return;
  const from = lot.place;
  lot.place = sheet.place;
  await work.em.flush();
  await logDeed(work, {
    action: `moved lot ${lot.tag} to ${sheet.place}, where it was found`,
    subjectKind: 'lot',
    subjectId: lot.id,
    detail: { from },
  });
}
