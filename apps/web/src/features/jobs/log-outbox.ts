import { logBench, type BodyInputOf, type Job } from '@hidewright/contract';
import { ApiProblem } from '../../lib/api-problem.ts';
import { call } from '../../lib/api.ts';
import { randomKey } from '../../lib/random-key.ts';

export type LogBody = BodyInputOf<typeof logBench>;

/** What was logged on this device and is not known to have arrived; its key makes it count once, however often it is sent. */
export interface WaitingLog {
  key: string;
  /** Whose it is: nobody else's session sends it. */
  person: string;
  jobId: number;
  body: LogBody;
}

const place = 'hidewright-waiting-logs';
const listeners = new Set<() => void>();
let waiting: readonly WaitingLog[] = read();

function read(): readonly WaitingLog[] {
  try {
    return JSON.parse(localStorage.getItem(place) ?? '[]') as WaitingLog[];
  } catch {
    return [];
  }
}

function keep(next: readonly WaitingLog[]): void {
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

export const waitingLogs = (): readonly WaitingLog[] => waiting;

export function putLog(log: Omit<WaitingLog, 'key'>): void {
  keep([...waiting, { ...log, key: randomKey() }]);
}

interface Answers {
  onSent: (job: Job) => void;
  onRefused: (log: WaitingLog, problem: ApiProblem) => void;
}

let sending = false;

/** Sends what this person has waiting, first things first; stops where the workshop's computer cannot be reached. */
export async function sendWaitingLogs(
  person: string,
  { onSent, onRefused }: Answers,
): Promise<void> {
  if (sending) return;
  sending = true;
  try {
    for (let log = nextOf(person); log !== undefined; log = nextOf(person)) {
      if (!(await sendOne(log, onSent, onRefused))) return;
    }
  } finally {
    sending = false;
  }
}

const nextOf = (person: string): WaitingLog | undefined =>
  waiting.find((log) => log.person === person);

/** Whether there is any use in sending the next. */
async function sendOne(
  log: WaitingLog,
  onSent: Answers['onSent'],
  onRefused: Answers['onRefused'],
): Promise<boolean> {
  const { key, jobId, body } = log;
  try {
    const job = await call(logBench, { params: { id: jobId }, body, idempotencyKey: key });
    drop(key);
    onSent(job);
    return true;
  } catch (error) {
    // Signed out or out of reach: it stays until it can be sent.
    if (!(error instanceof ApiProblem) || error.isPassing || error.status === 401) return false;
    drop(key);
    onRefused(log, error);
    return true;
  }
}

function drop(key: string): void {
  keep(waiting.filter((log) => log.key !== key));
}
