import { notFound, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findCount, isCounted, linesOf, requireCountState } from '../modules/counts/find-count.ts';
import type { StockCount } from '../modules/counts/stock-count.entity.ts';
import type { Work } from '../work.ts';

/**
 * Hands a sheet in. Lines that nobody counted change nothing, and that has to be said.
 * @throws {Problem} 404, 409 when it is not open, nothing is counted, or lines are left and that was not meant
 */
export async function handInCount(work: Work, id: number, leaveUncounted: boolean): Promise<void> {
  const sheet = await findCount(work.em, id);
  requireCountState(sheet, 'open');
  const lines = await linesOf(work.em, id);
  const left = lines.filter((line) => !isCounted(line)).length;
  if (left === lines.length) {
    throw wrongState('Nothing is counted yet. Count a line first, or put the sheet aside.', [
      'count',
    ]);
  }
  if (left > 0 && !leaveUncounted) {
    const lineWord = left === 1 ? '1 line is' : `${left} lines are`;
    throw wrongState(
      `${lineWord} not counted yet. Count the rest, or hand the sheet in and leave them as the books say.`,
      ['count the rest', 'leave them as the books say'],
    );
  }
  sheet.state = 'handed in';
  sheet.handedInAt = work.now.toISOString();
  sheet.handedInByName = work.actor.name;
  await work.em.flush();
  await tell(work, sheet, `handed in the count sheet ${sheet.title}`, { uncounted: left });
}

/**
 * Gives a sheet back for some lines to be counted once more, blind as before.
 * @throws {Problem} 404, 409 when it is not handed in
 */
export async function countAgain(work: Work, id: number, lineIds: number[]): Promise<void> {
  const sheet = await findCount(work.em, id);
  requireCountState(sheet, 'handed in');
  const lines = await linesOf(work.em, id);
  const asked = lines.filter((line) => lineIds.includes(line.id));
  if (asked.length < new Set(lineIds).size) throw notFound('line on this sheet');
  const earlier = asked.map((line) => ({ line: line.id, counted: line.counted }));
  for (const line of asked) {
    Object.assign(line, { counted: null, book: null, unmeasured: false, again: true });
    Object.assign(line, { countedAt: null, countedById: null, countedByName: null });
  }
  sheet.state = 'open';
  sheet.handedInAt = null;
  sheet.handedInByName = null;
  await work.em.flush();
  const lineWord = asked.length === 1 ? '1 line' : `${asked.length} lines`;
  await tell(work, sheet, `asked to count ${lineWord} of ${sheet.title} again`, { earlier });
}

/** @throws {Problem} 404, 409 when it is settled already */
export async function cancelCount(work: Work, id: number): Promise<void> {
  const sheet = await findCount(work.em, id);
  requireCountState(sheet, 'open', 'handed in');
  settle(work, sheet, 'cancelled');
  await work.em.flush();
  await tell(work, sheet, `put aside the count sheet ${sheet.title}`);
}

export function settle(work: Work, sheet: StockCount, state: 'approved' | 'cancelled'): void {
  sheet.state = state;
  sheet.settledAt = work.now.toISOString();
  sheet.settledByName = work.actor.name;
}

async function tell(
  work: Work,
  sheet: StockCount,
  action: string,
  detail: Record<string, unknown> = {},
): Promise<void> {
  await logDeed(work, { action, subjectKind: 'count', subjectId: sheet.id, detail });
}
