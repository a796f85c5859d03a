import { Decimal } from 'decimal.js';
import type { SheetTotals } from '@hidewright/contract';
import { moneyText } from '../http/decimal-text.ts';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Period } from '../modules/periods/period.entity.ts';
import { Posting } from '../modules/periods/posting.entity.ts';
import { readSalesSheet } from '../modules/periods/sales-sheet.ts';
import { sayPeriod } from '../modules/periods/say-period.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';

interface Days {
  fromDay: string;
  toDay: string;
}

/**
 * Locks the days of a period with the totals they stand at; nothing is posted into them afterwards.
 * @throws {Problem} 409 when some of its days are locked, or papers and ledger disagree; 422 when it is not over
 */
export async function lockPeriod(work: Work, days: Days): Promise<Period> {
  if (days.toDay > work.today) {
    const message = 'That period is not over. Choose a last day that is not after today.';
    throw invalid([{ field: 'toDay', message }]);
  }
  await requireUnlocked(work, days);
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const head = { ...days, workshopName: workshop.name, currency: workshop.currency };
  const { totals } = await readSalesSheet((sql, params) => work.em.execute(sql, params), head);
  await requireAgreement(work, days, totals);
  const period = work.em.create(Period, {
    ...days,
    totals,
    lockedAt: work.now.toISOString(),
    lockedBy: work.actor.name,
  });
  await work.em.flush();
  await logDeed(work, {
    action: `locked ${sayPeriod(days)}`,
    subjectKind: 'period',
    subjectId: period.id,
    detail: { ...days, total: totals.total, received: totals.received },
  });
  return period;
}

async function requireUnlocked({ em }: Work, { fromDay, toDay }: Days): Promise<void> {
  const locked = await em.findOne(
    Period,
    { fromDay: { $lte: toDay }, toDay: { $gte: fromDay } },
    { orderBy: { fromDay: 'asc' } },
  );
  if (locked === null) return;
  throw wrongState(`${sayPeriod(locked)} is locked already. Choose days outside it.`, [
    'choose other days',
  ]);
}

/** What the papers add up to and what was posted must be the same money. */
async function requireAgreement(
  { em }: Work,
  { fromDay, toDay }: Days,
  totals: SheetTotals,
): Promise<void> {
  const postings = await em.find(Posting, { day: { $gte: fromDay, $lte: toDay } });
  const posted = (account: Posting['account']) =>
    moneyText(
      postings
        .filter((posting) => posting.account === account)
        .reduce((sum, { amount }) => sum.plus(amount), new Decimal(0))
        .abs(),
    );
  const agrees =
    posted('sales') === totals.net &&
    posted('tax') === totals.tax &&
    posted('money') === totals.received;
  if (agrees) return;
  throw wrongState(
    'The invoices and payments of these days do not agree with the ledger, so they were not locked. ' +
      'Have the database verified before you go on.',
    [],
  );
}
