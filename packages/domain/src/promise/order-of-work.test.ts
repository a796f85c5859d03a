import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fewestLate } from './late-jobs.ts';
import { orderForTwoMachines } from './two-machine.ts';

function permutations(items: number[]): number[][] {
  if (items.length < 2) return [items];
  return items.flatMap((first) =>
    permutations(items.filter((item) => item !== first)).map((rest) => [first, ...rest]),
  );
}

const everyOrder = (count: number): number[][] =>
  permutations(Array.from({ length: count }, (_, at) => at + 1));

const aTime = fc.integer({ min: 0, max: 9 });

function lateIn(order: number[], jobs: { time: number; due: number }[]): number {
  let [end, late] = [0, 0];
  for (const number of order) {
    const { time, due } = jobs[number - 1]!;
    end += time;
    if (end > due) late += 1;
  }
  return late;
}

describe('fewestLate', () => {
  const someJobs = fc.array(fc.record({ time: aTime, due: fc.integer({ min: 0, max: 25 }) }), {
    minLength: 1,
    maxLength: 5,
  });

  it('is as good as the best of all orders, and its order shows it', () => {
    fc.assert(
      fc.property(someJobs, (jobs) => {
        const { late, order } = fewestLate(jobs);
        expect([...order].sort()).toEqual(jobs.map((_, at) => at + 1));
        expect(lateIn(order, jobs)).toBe(late);
        expect(late).toBe(Math.min(...everyOrder(jobs.length).map((each) => lateIn(each, jobs))));
      }),
    );
  });

  it('calls a job on time that ends when it is due, to the last tenth', () => {
    const jobs = [
      { time: 0.1, due: 0.1 },
      { time: 0.2, due: 0.3 },
    ];
    expect(fewestLate(jobs)).toEqual({ late: 0, order: [1, 2] });
  });

  it.each([
    ['jobs', []],
    ['jobs.0.time', [{ time: -1, due: 3 }]],
    ['jobs.0.due', [{ time: 1, due: Number.POSITIVE_INFINITY }]],
  ])('refuses %s where it makes no sense', (field, jobs) => {
    expect(() => fewestLate(jobs)).toThrow(expect.objectContaining({ field }));
  });
});

function makespanIn(order: number[], jobs: [number, number][]): number {
  let [first, second] = [0, 0];
  for (const number of order) {
    const [a, b] = jobs[number - 1]!;
    first += a;
    second = Math.max(first, second) + b;
  }
  return second;
}

describe('orderForTwoMachines', () => {
  it('is as quick as the best of all orders', () => {
    const someJobs = fc.array(fc.tuple(aTime, aTime), { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(someJobs, (jobs) => {
        const { order, makespan } = orderForTwoMachines(jobs);
        const best = Math.min(...everyOrder(jobs.length).map((each) => makespanIn(each, jobs)));
        expect(makespanIn(order, jobs)).toBe(makespan);
        expect(makespan).toBe(best);
      }),
    );
  });

  it('keeps the list at a tie', () => {
    const jobs: [number, number][] = [
      [2, 2],
      [2, 5],
      [6, 3],
      [9, 3],
    ];
    expect(orderForTwoMachines(jobs).order).toEqual([1, 2, 3, 4]);
  });

  it('refuses times that make no sense', () => {
    expect(() => orderForTwoMachines([])).toThrow('at least one job');
    expect(() => orderForTwoMachines([[1, -2]])).toThrow('jobs.0.1');
  });
});
