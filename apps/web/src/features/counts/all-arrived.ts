import { ApiProblem } from '../../lib/api-problem.ts';
import { entryOutbox, ofSheet, refusedEntries, type WaitingEntry } from './entry-outbox.ts';

/**
 * Sends what was counted, and sees to it that the sheet holds all of it.
 * @throws {ApiProblem} when figures still wait on this device, or one was refused on the way
 */
export async function requireAllArrived(
  sheet: Pick<WaitingEntry, 'person' | 'countId'>,
  send: () => Promise<void>,
): Promise<void> {
  const refusedBefore = ofSheet(refusedEntries.all(), sheet).length;
  await send();
  const waits = ofSheet(entryOutbox.waiting(), sheet).length;
  if (waits > 0) throw notYet(stillWaiting(waits));
  if (ofSheet(refusedEntries.all(), sheet).length > refusedBefore)
    throw notYet('A figure was refused, and nothing is handed in. Go on counting to see which.');
}

const stillWaiting = (count: number): string =>
  count === 1
    ? '1 figure still waits on this device, and nothing is handed in. Try again in a moment.'
    : `${count} figures still wait on this device, and nothing is handed in. Try again in a moment.`;

function notYet(detail: string): ApiProblem {
  return new ApiProblem({ status: 0, title: 'Not all has arrived', detail });
}
