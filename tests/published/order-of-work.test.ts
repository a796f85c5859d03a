import { compute } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

const jobsOf = (times: number[], dues: number[]) =>
  times.map((time, at) => ({ time, due: dues[at] }));

describe('the fewest late jobs', () => {
  // Ten jobs: a lecture's example of Moore and Hodgson's rule. Five jobs: Pinedo, Scheduling, example
  // 3.3.3 (from memory); the other five: Heizer and Render (from memory). All verified by trying
  // every order. On time first, then the late ones.
  it.each([
    [
      jobsOf([19, 23, 5, 31, 17, 8, 32, 41, 26, 18], [48, 75, 170, 215, 205, 240, 85, 67, 100, 95]),
      { late: 2, order: [1, 2, 10, 9, 3, 5, 4, 6, 8, 7] },
    ],
    [jobsOf([7, 8, 4, 6, 6], [9, 17, 18, 19, 21]), { late: 2, order: [3, 4, 5, 2, 1] }],
    [jobsOf([6, 2, 8, 3, 9], [8, 6, 18, 15, 23]), { late: 1, order: [2, 1, 4, 5, 3] }],
  ])('%#', (jobs, answer) => {
    expect(compute('late-jobs', { jobs })).toEqual(answer);
  });
});

describe('the order for two machines', () => {
  // Johnson's rule: A to E by Heizer and Render (from memory); the others are exercises found with
  // their data (M1 of the second is also printed as 12, 22). All proved best by trying every order.
  it.each([
    [
      'A to E',
      [
        [5, 2],
        [3, 6],
        [8, 4],
        [10, 7],
        [7, 12],
      ],
      [2, 5, 4, 3, 1],
      35,
    ],
    [
      'M1 to M5',
      [
        [11, 22],
        [4, 5],
        [5, 3],
        [15, 16],
        [10, 8],
      ],
      [2, 1, 4, 5, 3],
      64,
    ],
    [
      'the same, printed',
      [
        [12, 22],
        [4, 5],
        [5, 3],
        [15, 16],
        [10, 8],
      ],
      [2, 1, 4, 5, 3],
      65,
    ],
    [
      'A to G',
      [
        [10, 11],
        [8, 17],
        [14, 10],
        [13, 7],
        [10, 8],
        [25, 9],
        [6, 15],
      ],
      [7, 2, 1, 3, 6, 5, 4],
      93,
    ],
    // The exercise's own answer is 26, which is only when the first machine is done.
    [
      'L to P',
      [
        [10, 2],
        [5, 4],
        [7, 5],
        [3, 6],
        [1, 7],
      ],
      [5, 4, 3, 2, 1],
      28,
    ],
  ])('of %s', (_name, jobs, order, makespan) => {
    expect(compute('two-machine', { jobs })).toEqual({ order, makespan });
  });
});
