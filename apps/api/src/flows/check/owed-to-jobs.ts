import type { Dated } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Decimal } from 'decimal.js';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import type { JobEstimate } from '../job-estimate.ts';
import { readStandIns } from './stand-ins-for-check.ts';
import { withoutStoodFor } from './stood-for.ts';

/** What jobs that are not finished still need and do not hold, as the ledger counts: promised and not yet reserved. */
export interface OwedToJobs {
  hardware: (hardwareId: number) => Dated[];
  leather: (leatherId: number) => Dated[];
}

interface JobRow {
  id: number;
  number: string;
  title: string;
  promised_on: string;
  estimate: string;
}

interface HeldRow {
  job_id: number;
  hardware_id: number | null;
  leather_id: number | null;
  quantity: number;
  open: number;
}

interface TakenRow {
  job_id: number;
  hardware_id: number | null;
  leather_id: number | null;
  taken: number;
}

interface Owed extends Dated {
  hardwareId?: number;
  leatherId?: number;
}

export async function readOwedToJobs(em: EntityManager): Promise<OwedToJobs> {
  const jobs = await em.execute<JobRow[]>(
    `SELECT j.id, j.number, o.title, o.promised_on, j.estimate FROM job j JOIN customer_order o ON o.id = j.order_id
    WHERE j.state <> 'finished' AND o.state <> 'cancelled' ORDER BY o.promised_on, j.id`,
  );
  const ids = JSON.stringify(jobs.map(({ id }) => id));
  const held = await em.execute<HeldRow[]>(
    `SELECT r.job_id, r.hardware_id, l.leather_id, SUM(r.quantity) AS quantity, SUM(r.open) AS open
    FROM reservation r LEFT JOIN lot l ON l.id = r.lot_id
    WHERE r.job_id IN (SELECT value FROM json_each(?)) GROUP BY r.job_id, r.hardware_id, l.leather_id`,
    [ids],
  );
  // Whoever held all of it owes nothing; only for the others does the long ledger have to be read.
  const lacking = jobs.flatMap((job) => lackingOf(job, held));
  const standIns = await readStandIns(em, hardwareOf(lacking));
  const taken = lacking.length === 0 ? [] : await takenBy(em, lacking, standIns.partIds);
  const missing = lacking
    .map((each) => ({ ...each, quantity: each.quantity - takenBeyond(each, held, taken) }))
    .filter(({ quantity }) => quantity > 0);
  const short = new Set(missing.map(({ jobId }) => jobId));
  const needs = neededBy(jobs.filter(({ id }) => short.has(id)));
  const owed = withoutStoodFor(missing, standIns.of, (which) => {
    const has = sumOf(held, which, (row) => row.open) + sumOf(taken, which, (row) => row.taken);
    return has - needs(which);
  });
  return {
    hardware: (id) => owed.filter(({ hardwareId }) => hardwareId === id),
    leather: (id) => owed.filter(({ leatherId }) => leatherId === id),
  };
}

interface Lacking extends Owed {
  jobId: number;
}

const hardwareOf = (lacking: readonly Lacking[]): number[] => [
  ...new Set(lacking.flatMap(({ hardwareId }) => hardwareId ?? [])),
];

/** How many of some hardware a job asks for itself. */
function neededBy(jobs: readonly JobRow[]) {
  const byJob = new Map(
    jobs.map(({ id, estimate }) => [id, (JSON.parse(estimate) as JobEstimate).hardware]),
  );
  return (which: { jobId: number; hardwareId: number }): number =>
    (byJob.get(which.jobId) ?? [])
      .filter(({ hardwareId }) => hardwareId === which.hardwareId)
      .reduce((sum, { quantity }) => sum + quantity, 0);
}

/** What a job needs beyond all that was ever held for it. */
function lackingOf(job: JobRow, held: readonly HeldRow[]): Lacking[] {
  const { leatherId, leatherAreaMm2, hardware } = JSON.parse(job.estimate) as JobEstimate;
  const needs: Omit<Lacking, 'day' | 'paper' | 'jobId'>[] = [
    { leatherId, quantity: scaled(new Decimal(leatherAreaMm2), 3) },
    ...hardware,
  ];
  return needs.flatMap((need) => {
    const quantity = need.quantity - sumOf(held, { ...need, jobId: job.id }, (row) => row.quantity);
    const paper = `${job.number} ${job.title}`;
    return quantity > 0 ? [{ ...need, quantity, day: job.promised_on, paper, jobId: job.id }] : [];
  });
}

type Keyed = { job_id: number; hardware_id: number | null; leather_id: number | null };
type Which = { jobId: number; hardwareId?: number; leatherId?: number };

function sumOf<Row extends Keyed>(
  rows: readonly Row[],
  { jobId, hardwareId, leatherId }: Which,
  value: (row: Row) => number,
): number {
  return rows
    .filter(
      (row) =>
        row.job_id === jobId &&
        row.hardware_id === (hardwareId ?? null) &&
        row.leather_id === (leatherId ?? null),
    )
    .reduce((sum, row) => sum + value(row), 0);
}

/** Taken although it was not held: that is no longer owed. */
function takenBeyond(which: Which, held: readonly HeldRow[], taken: readonly TakenRow[]): number {
  const fromHeld = sumOf(held, which, (row) => row.quantity - row.open);
  return Math.max(0, sumOf(taken, which, (row) => row.taken) - fromHeld);
}

async function takenBy(
  em: EntityManager,
  lacking: readonly Lacking[],
  standInIds: readonly number[],
): Promise<TakenRow[]> {
  const list = (values: (number | undefined)[]) =>
    JSON.stringify([...new Set(values.filter((value) => value !== undefined))]);
  const jobs = list(lacking.map(({ jobId }) => jobId));
  const ofHardware = await em.execute<TakenRow[]>(
    `SELECT job_id, hardware_id, NULL AS leather_id, -SUM(quantity) AS taken FROM stock_movement
    WHERE hardware_id IN (SELECT value FROM json_each(?)) AND job_id IN (SELECT value FROM json_each(?))
    GROUP BY job_id, hardware_id`,
    [list([...hardwareOf(lacking), ...standInIds]), jobs],
  );
  const ofLeather = await em.execute<TakenRow[]>(
    `SELECT m.job_id, NULL AS hardware_id, l.leather_id, -SUM(m.quantity) AS taken
    FROM lot l JOIN stock_movement m ON m.lot_id = l.id
    WHERE l.leather_id IN (SELECT value FROM json_each(?)) AND m.job_id IN (SELECT value FROM json_each(?))
    GROUP BY m.job_id, l.leather_id`,
    [list(lacking.map(({ leatherId }) => leatherId)), jobs],
  );
  return [...ofHardware, ...ofLeather];
}
