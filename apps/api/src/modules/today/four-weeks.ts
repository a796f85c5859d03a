import { addDays, addWorkdays, workdaysBetween } from '@hidewright/domain';
import type { PromisedJob, Today } from '@hidewright/contract';
import type { Work } from '../../work.ts';
import { Workshop } from '../workshop/workshop.entity.ts';

interface Row {
  id: number;
  number: string;
  title: string;
  customer: string;
  state: string;
  promised_on: string;
  in_hands_on: string | null;
  planned: number;
  logged: number;
}

const openJobs = `SELECT j.id, j.number, o.title, c.name AS customer, j.state, o.promised_on, o.in_hands_on,
    j.planned_minutes AS planned, (SELECT COALESCE(SUM(minutes), 0) FROM job_step WHERE job_id = j.id) AS logged
  FROM job j JOIN customer_order o ON o.id = j.order_id JOIN customer c ON c.id = o.customer_id
  WHERE j.state <> 'finished' AND o.state <> 'cancelled' ORDER BY o.promised_on, j.id`;

/** The open jobs over four weeks, worked off one after the other in the order in which they are promised. */
export async function fourWeeks(work: Work): Promise<NonNullable<Today['fourWeeks']>> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const rows = await work.em.execute<Row[]>(openJobs);
  const dayMinutes = workshop.benchHoursPerDay.times(60).toNumber();
  const until = addDays(work.today, 27);
  return {
    from: work.today,
    until,
    promisedMinutes: rows.reduce((sum, row) => sum + left(row), 0).toFixed(0),
    benchMinutes: (workdaysBetween(work.today, until) * dayMinutes).toFixed(0),
    jobs: queued(rows, work.today, dayMinutes),
  };
}

/** Minutes are kept in hundredths. */
const left = (row: Row) => Math.max(0, row.planned - row.logged) / 100;

function queued(rows: Row[], today: string, dayMinutes: number): PromisedJob[] {
  let before = 0;
  return rows.map((row) => {
    const startOn = dayAfter(before, today, dayMinutes);
    before += left(row);
    const endOn = dayAfter(Math.max(0, before - 1), today, dayMinutes);
    return {
      number: row.number,
      title: row.title,
      customerName: row.customer,
      state: row.state,
      promisedOn: row.promised_on,
      inHandsOn: row.in_hands_on,
      startOn,
      doneShare: row.planned === 0 ? 0 : Math.min(1, row.logged / row.planned),
      late: endOn > row.promised_on,
      to: `/bench/jobs/${row.id}`,
    };
  });
}

function dayAfter(minutes: number, today: string, dayMinutes: number): string {
  if (dayMinutes === 0) return today;
  const days = Math.floor(minutes / dayMinutes);
  // Beyond two working years no day is worth naming; it also keeps the search for it short.
  return addWorkdays(today, Math.min(days, 500));
}
