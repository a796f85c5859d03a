import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface TwoMachineOrder {
  /** jobs by their place in the list, from 1 */
  order: number[];
  /** from the first job begun to the last finished on the second machine */
  makespan: number;
}

interface Job {
  number: number;
  first: Decimal;
  second: Decimal;
}

/**
 * The order in which jobs that pass a first and then a second machine are finished soonest (Johnson,
 * Naval Research Logistics Quarterly 1, 1954; from memory): jobs that are not longer on the first
 * come first, by rising time there; the others after them, by falling time on the second. At a tie
 * the job earlier in the list comes first.
 * @param jobs time on the first and on the second machine, each 0 or more
 * @throws InvalidInput
 */
export function orderForTwoMachines(jobs: readonly (readonly [number, number])[]): TwoMachineOrder {
  if (jobs.length === 0) throw new InvalidInput('jobs', 'Give at least one job.');
  const read = jobs.map(([first, second], at) => ({
    number: at + 1,
    first: new Exact(readNumber(first, `jobs.${at}.0`, { min: 0 })),
    second: new Exact(readNumber(second, `jobs.${at}.1`, { min: 0 })),
  }));
  const rising = read.filter(isRising).sort((a, b) => a.first.comparedTo(b.first));
  const falling = read
    .filter((job) => !isRising(job))
    .sort((a, b) => b.second.comparedTo(a.second));
  const order = [...rising, ...falling];
  return { order: order.map(({ number }) => number), makespan: makespanOf(order).toNumber() };
}

const isRising = ({ first, second }: Job): boolean => first.lte(second);

function makespanOf(order: readonly Job[]): Decimal {
  let [firstFree, secondFree] = [new Exact(0), new Exact(0)];
  for (const { first, second } of order) {
    firstFree = firstFree.plus(first);
    secondFree = Exact.max(firstFree, secondFree).plus(second);
  }
  return secondFree;
}
