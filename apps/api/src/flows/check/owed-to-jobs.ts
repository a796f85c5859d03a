import type { Dated } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Decimal } from 'decimal.js';
import type { DayOver } from '../../day-in.ts';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import type { JobEstimate } from '../job-estimate.ts';
import { readHoldings, type BrokenRow, type Holding, type JobRow } from './job-holdings.ts';
import { readStandIns } from './stand-ins-for-check.ts';
import { withoutStoodFor } from './stood-for.ts';

/** What a job needs and does not have, on the day on which it is promised. */
export interface OwedToJob extends Dated {
  jobId: number;
}

/** What jobs that are not finished still need and do not hold, as the ledger counts: promised and not yet reserved. */
export interface OwedToJobs {
  hardware: (hardwareId: number) => OwedToJob[];
  leather: (leatherId: number) => OwedToJob[];
}

type Item = { hardwareId: number } | { leatherId: number };

interface Owed extends OwedToJob {
  hardwareId?: number;
  leatherId?: number;
}

/**
 * What a job needs by its estimate, less what it holds and has taken, of the thing itself or in its place. Held and
 * not there, since a count found less, is needed as well.
 * @param then at the end of an earlier day; now, where it is left out
 */
export async function readOwedToJobs(
  em: EntityManager,
  then: DayOver | null = null,
): Promise<OwedToJobs> {
  const { jobs, holdings, broken } = await readHoldings(em, then);
  const has = hadBy(holdings);
  const needs = jobs.map((job) => ({ job, lines: linesOf(job) }));
  const lacking = needs.flatMap(({ job, lines }) => lackingOf(job, lines, has));
  const standIns = await readStandIns(em, [
    ...new Set(lacking.flatMap(({ hardwareId }) => hardwareId ?? [])),
  ]);
  const needed = new Map(
    needs.flatMap(({ job, lines }) =>
      lines.map((line) => [keyOf(job.id, line), line.quantity] as const),
    ),
  );
  const owed = withoutStoodFor(lacking, standIns.of, ({ jobId, hardwareId }) => {
    const key = keyOf(jobId, { hardwareId });
    return (has.get(key) ?? 0) - (needed.get(key) ?? 0);
  });
  const byItem = groupedByItem([...owed, ...missingOf(broken, jobs)]);
  return {
    hardware: (hardwareId) => byItem.get(itemKey({ hardwareId })) ?? [],
    leather: (leatherId) => byItem.get(itemKey({ leatherId })) ?? [],
  };
}

function groupedByItem(owed: readonly Owed[]): Map<string, Owed[]> {
  const byItem = new Map<string, Owed[]>();
  for (const each of owed) {
    const key = itemKey(each);
    byItem.set(key, [...(byItem.get(key) ?? []), each]);
  }
  return byItem;
}

const itemKey = (item: { hardwareId?: number; leatherId?: number }): string =>
  item.leatherId === undefined ? `hardware ${item.hardwareId}` : `leather ${item.leatherId}`;

const keyOf = (jobId: number, item: Item): string => `${jobId} ${itemKey(item)}`;

/** What each job holds and has taken of each thing. */
function hadBy(holdings: readonly Holding[]): Map<string, number> {
  return new Map(
    holdings.map(({ job_id, hardware_id, leather_id, held, taken }) => {
      const item =
        leather_id === null ? { hardwareId: hardware_id ?? 0 } : { leatherId: leather_id };
      return [keyOf(job_id, item), held + Math.max(0, taken)];
    }),
  );
}

/** What a job needs by its estimate, each thing once. */
function linesOf({ estimate }: JobRow): (Item & { quantity: number })[] {
  const { leatherId, leatherAreaMm2, hardware } = JSON.parse(estimate) as JobEstimate;
  const sums = new Map<number, number>();
  for (const { hardwareId, quantity } of hardware)
    sums.set(hardwareId, (sums.get(hardwareId) ?? 0) + quantity);
  return [
    { leatherId, quantity: scaled(new Decimal(leatherAreaMm2), 3) },
    ...[...sums].map(([hardwareId, quantity]) => ({ hardwareId, quantity })),
  ];
}

function lackingOf(
  { id: jobId, number, title, promised_on: day }: JobRow,
  lines: ReturnType<typeof linesOf>,
  has: ReadonlyMap<string, number>,
): Owed[] {
  return lines.flatMap((line) => {
    const quantity = line.quantity - (has.get(keyOf(jobId, line)) ?? 0);
    return quantity > 0 ? [{ ...line, quantity, day, paper: `${number} ${title}`, jobId }] : [];
  });
}

/** Who is promised last goes without what was held and is not there. */
function missingOf(broken: readonly BrokenRow[], jobs: readonly JobRow[]): Owed[] {
  return broken.flatMap(({ hardware_id, leather_id, missing, holders }) => {
    const item = leather_id === null ? { hardwareId: hardware_id ?? 0 } : { leatherId: leather_id };
    let left = missing;
    return (JSON.parse(holders) as [number, number][]).flatMap(([jobId, held]): Owed[] => {
      const job = jobs.find(({ id }) => id === jobId);
      const quantity = Math.min(left, held);
      left -= quantity;
      if (job === undefined || quantity === 0) return [];
      const paper = `${job.number} ${job.title}`;
      return [{ ...item, quantity, day: job.promised_on, paper, jobId }];
    });
  });
}
