import { enterCount, type ReplyOf } from '@hidewright/contract';
import { call } from '../../lib/api.ts';
import { KeptList } from '../../lib/kept-list.ts';
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

/** What was counted and is not taken: it stays visible on its own sheet until somebody has seen it. */
export interface RefusedEntry extends WaitingEntry {
  why: string;
}

export const refusedEntries = new KeptList<RefusedEntry>('hidewright-refused-counts');

type Line = Pick<WaitingEntry, 'person' | 'lineId'>;
type Sheet = Pick<WaitingEntry, 'person' | 'countId'>;

const sameLine = (one: Line) => (other: Line) =>
  other.person === one.person && other.lineId === one.lineId;

const onSheet = (one: Sheet) => (other: Sheet) =>
  other.person === one.person && other.countId === one.countId;

/** What is typed later of a line stands instead of what still waits, or was refused. */
export function putEntry(entry: Omit<WaitingEntry, 'typedAt'>): void {
  refusedEntries.keep(refusedEntries.all().filter((each) => !sameLine(entry)(each)));
  entryOutbox.put({ ...entry, typedAt: Date.now() }, sameLine(entry));
}

/** What is typed there now is no figure: the beginning of it, which was one, is not sent. */
export function takeBackEntry(line: Line): void {
  entryOutbox.takeBack(sameLine(line));
}

export function keepRefused(refused: WaitingEntry, why: string): void {
  const others = refusedEntries.all().filter((each) => !sameLine(refused)(each));
  refusedEntries.keep([...others, { ...refused, why }]);
}

export function forgetRefused(sheet: Sheet): void {
  refusedEntries.keep(refusedEntries.all().filter((each) => !onSheet(sheet)(each)));
}

/** What of a sheet waits on this device, or was refused. */
export function ofSheet<Each extends Sheet>(all: readonly Each[], sheet: Sheet): readonly Each[] {
  return all.filter(onSheet(sheet));
}
