import { enterCount, type ReplyOf } from '@hidewright/contract';
import { call } from '../../lib/api.ts';
import { Outbox } from '../../lib/outbox.ts';

/** What was counted: nothing named takes the count away again. */
export interface Entry {
  areaMm2?: string;
  quantity?: number;
  unmeasured?: true;
}

export interface WaitingEntry {
  person: string;
  countId: number;
  lineId: number;
  entry: Entry;
  /** By this device's own clock, in ms, so that the books of that moment are meant. */
  typedAt: number;
}

export const entryOutbox = new Outbox<WaitingEntry, ReplyOf<typeof enterCount>>(
  'hidewright-waiting-counts',
  ({ countId, lineId, entry, typedAt }) => {
    const secondsAgo = Math.max(0, Math.floor((Date.now() - typedAt) / 1000));
    return call(enterCount, {
      params: { id: countId, lineId },
      body: { ...entry, secondsAgo },
    });
  },
);

/** What is typed later of a line stands instead of what still waits. */
export function putEntry(entry: Omit<WaitingEntry, 'typedAt'>): void {
  entryOutbox.put(
    { ...entry, typedAt: Date.now() },
    ({ person, lineId }) => person === entry.person && lineId === entry.lineId,
  );
}
