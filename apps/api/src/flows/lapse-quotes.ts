import { logDeed } from '../modules/activity/activity-log.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import type { Work } from '../work.ts';

/** Lets every quote lapse whose last day is over, and says how many did. */
export async function lapseQuotes(work: Work): Promise<number> {
  const over = await work.em.find(Quote, { state: 'sent', validUntil: { $lt: work.today } });
  for (const quote of over) {
    quote.state = 'lapsed';
    await work.em.flush();
    await logDeed(work, {
      action: `let quote ${quote.number} lapse`,
      subjectKind: 'quote',
      subjectId: quote.id,
    });
  }
  return over.length;
}
