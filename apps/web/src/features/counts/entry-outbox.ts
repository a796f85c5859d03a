import { enterCount, type ReplyOf } from '@hidewright/contract';
import { ApiProblem } from '../../lib/api-problem.ts';
import { call } from '../../lib/api.ts';

/** What was counted: nothing named takes the count away again. */
export interface Entry {
  areaMm2?: string;
  quantity?: number;
  unmeasured?: true;
}

/** What was typed on this device and is not known to have arrived. */
export interface WaitingEntry {
  /** Whose it is: nobody else's session sends it. */
  person: string;
  countId: number;
  lineId: number;
  entry: Entry;
  /** By this device's own clock, in ms, so that the books of that moment are meant. */
  typedAt: number;
}

const place = 'hidewright-waiting-counts';
const listeners = new Set<() => void>();
let waiting: readonly WaitingEntry[] = read();

function read(): readonly WaitingEntry[] {
  try {
    return JSON.parse(localStorage.getItem(place) ?? '[]') as WaitingEntry[];
  } catch {
    return [];
  }
}

function keep(next: readonly WaitingEntry[]): void {
  waiting = next;
  try {
    localStorage.setItem(place, JSON.stringify(next));
  } catch {
    // Storage is full or switched off: what waits is kept as long as this page is open.
  }
  for (const listener of listeners) listener();
}

export function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export const waitingEntries = (): readonly WaitingEntry[] => waiting;

const sameLine = (one: WaitingEntry, other: Omit<WaitingEntry, 'typedAt'>): boolean =>
  one.person === other.person && one.lineId === other.lineId;

/** What is typed later of a line stands instead of what still waits. */
export function putEntry(entry: Omit<WaitingEntry, 'typedAt'>): void {
  const others = waiting.filter((each) => !sameLine(each, entry));
  keep([...others, { ...entry, typedAt: Date.now() }]);
}

interface Answers {
  onSent: (sent: WaitingEntry, reply: ReplyOf<typeof enterCount>) => void;
  onRefused: (entry: WaitingEntry, problem: ApiProblem) => void;
}

let sending = false;

/** Sends what this person has waiting; stops where the workshop's computer cannot be reached. */
export async function sendWaitingEntries(person: string, answers: Answers): Promise<void> {
  if (sending) return;
  sending = true;
  try {
    for (let next = nextOf(person); next !== undefined; next = nextOf(person)) {
      if (!(await sendOne(next, answers))) return;
    }
  } finally {
    sending = false;
  }
}

const nextOf = (person: string): WaitingEntry | undefined =>
  waiting.find((entry) => entry.person === person);

/** Whether there is any use in sending the next. */
async function sendOne(waits: WaitingEntry, { onSent, onRefused }: Answers): Promise<boolean> {
  const { countId, lineId, entry, typedAt } = waits;
  const secondsAgo = Math.max(0, Math.floor((Date.now() - typedAt) / 1000));
  try {
    const params = { id: countId, lineId };
    const reply = await call(enterCount, { params, body: { ...entry, secondsAgo } });
    drop(waits);
    onSent(waits, reply);
    return true;
  } catch (error) {
    // Signed out or out of reach: it stays until it can be sent.
    if (!(error instanceof ApiProblem) || error.isPassing || error.status === 401) return false;
    drop(waits);
    onRefused(waits, error);
    return true;
  }
}

/** Only what was sent: a later figure for the same line may have come meanwhile. */
function drop(sent: WaitingEntry): void {
  keep(waiting.filter((each) => each !== sent));
}
