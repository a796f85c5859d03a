import { wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { revokeLinks } from '../modules/links/customer-links.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import type { Work } from '../work.ts';

/**
 * Lets one revision of a quote stand alone: the others that were out become superseded, and their links stop.
 * @throws {Problem} 409 when another revision was agreed already
 */
export async function supersedeOthers(work: Work, quote: Quote): Promise<void> {
  const others = await work.em.find(Quote, { number: quote.number, id: { $ne: quote.id } });
  const agreed = others.find((other) => other.state === 'agreed');
  if (agreed !== undefined) {
    throw wrongState(
      `Revision ${agreed.revision} of quote ${quote.number} has been agreed. Take the order on from that one.`,
      ['decline'],
    );
  }
  for (const other of others) {
    if (other.state === 'draft' || other.state === 'superseded') continue;
    other.state = 'superseded';
    await work.em.flush();
    await revokeLinks(work, other.id);
    await logDeed(work, {
      action: `replaced revision ${other.revision} of quote ${other.number}`,
      subjectKind: 'quote',
      subjectId: other.id,
      detail: { by: quote.revision },
    });
  }
}
