import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface DueJob {
  /** work it takes, 0 or more */
  time: number;
  /** when it must be finished, counted from now in the unit of `time`; 0 or more */
  due: number;
}

export interface FewestLate {
  /** how many jobs are late */
  late: number;
  /** all jobs by their place in the list, from 1: first those on time by due date, then the late ones */
  order: number[];
}

interface Numbered {
  number: number;
  time: Decimal;
  due: Decimal;
}

/**
 * The order of work at one bench that makes the fewest jobs late (Moore, Management Science 15,
 * 1968, with Hodgson's simplification; from memory). Jobs are taken by due date, earlier in the list
 * first at a tie; when one would end late, the longest taken so far is put off, the last of them at
 * a tie. What is put off comes at the end, in the order in which it was.
 * @throws InvalidInput
 */
export function fewestLate(jobs: readonly DueJob[]): FewestLate {
  if (jobs.length === 0) throw new InvalidInput('jobs', 'Give at least one job.');
  const byDue = jobs.map(numbered).sort((a, b) => a.due.comparedTo(b.due) || a.number - b.number);
  const onTime: Numbered[] = [];
  const late: Numbered[] = [];
  let end = new Exact(0);
  for (const job of byDue) {
    onTime.push(job);
    end = end.plus(job.time);
    if (end.lte(job.due)) continue;
    const [putOff = job] = onTime.splice(longestOf(onTime), 1);
    late.push(putOff);
    end = end.minus(putOff.time);
  }
  return { late: late.length, order: [...onTime, ...late].map(({ number }) => number) };
}

function numbered({ time, due }: DueJob, at: number): Numbered {
  return {
    number: at + 1,
    time: new Exact(readNumber(time, `jobs.${at}.time`, { min: 0 })),
    due: new Exact(readNumber(due, `jobs.${at}.due`, { min: 0 })),
  };
}

function longestOf(jobs: readonly Numbered[]): number {
  return jobs.reduce((longest, job, at) => {
    const most = jobs[longest];
    return most && most.time.gt(job.time) ? longest : at;
  }, 0);
}
