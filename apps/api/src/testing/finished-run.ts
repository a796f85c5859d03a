import type { Job } from '@hidewright/contract';
import { takenOn, ticketOf, type BenchShop } from './bench-shop.ts';

/** What is logged on a step, by its name. */
type Logs = Record<string, { good?: number; rejects?: number; minutes?: string }>;

/** A run of 50 from being taken on to finished, with what its maker logged and took. */
export async function finishedRun(
  ready: BenchShop,
  logs: Logs,
  finished: object = { good: 50 },
  takes: (ticket: Job) => object[] = () => [],
): Promise<Job> {
  const ticket = await ticketOf(ready, await takenOn(ready, 50, { evenIfShort: true }));
  const post = (what: string, body: object) =>
    ready.shop.as('maker').post(`/api/jobs/${ticket.id}/${what}`).send(body).expect(201);
  for (const taking of takes(ticket)) await post('takings', taking);
  for (const { id, name } of ticket.steps) {
    const log = logs[name];
    if (log !== undefined) await post('logs', { stepId: id, ...log });
  }
  return (await post('finish', finished)).body as Job;
}
