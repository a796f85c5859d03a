import { logBench, type BodyInputOf, type Job } from '@hidewright/contract';
import { call } from '../../lib/api.ts';
import { Outbox } from '../../lib/outbox.ts';
import { randomKey } from '../../lib/random-key.ts';

export type LogBody = BodyInputOf<typeof logBench>;

/** A log with its key, which makes it count once, however often it is sent. */
export interface WaitingLog {
  key: string;
  person: string;
  jobId: number;
  body: LogBody;
}

export const logOutbox = new Outbox<WaitingLog, Job>(
  'hidewright-waiting-logs',
  ({ key, jobId, body }) => call(logBench, { params: { id: jobId }, body, idempotencyKey: key }),
);

export function putLog(log: Omit<WaitingLog, 'key'>): void {
  logOutbox.put({ ...log, key: randomKey() });
}
