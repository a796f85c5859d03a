import { describe, expect, it } from 'vitest';
import { nestFaults } from './nest-faults.ts';
import type { NestProblem } from './problem.ts';

const bar = [
  { x: 0, y: 0 },
  { x: 40, y: 0 },
  { x: 40, y: 10 },
  { x: 0, y: 10 },
];
const problem: NestProblem = {
  outline: bar,
  container: { type: 'rect', w: 100, h: 100 },
  gap: 2,
  rotations: [0, 90],
};
const at = (x: number, y: number, rot = 0) => ({ x, y, rot });

describe('looking over a layout', () => {
  it('finds nothing wrong where spacing and edges are kept', () => {
    expect(nestFaults(problem, [at(0, 0), at(42, 0), at(0, 12), at(100, 60, 90)])).toEqual([]);
  });

  it.each([
    ['overlaps', [at(0, 0), at(30, 5)]],
    ['overlaps', [at(20, 20), at(45, 5, 90)]],
    ['too close', [at(0, 0), at(0, 11.9)]],
    ['outside', [at(61, 0)]],
    ['outside', [at(0, 0, 90)]],
  ] as const)('finds what %s', (what, placements) => {
    const faults = nestFaults({ ...problem, gap: what === 'too close' ? 2 : 0 }, placements);
    expect(faults.map((fault) => fault.what)).toEqual([what]);
  });

  it('finds a scratch that passes right under a piece, and a notch that reaches into it', () => {
    const scratch = [at(-5, 24), at(60, 24), at(60, 25), at(-5, 25)];
    const flawed = { ...problem, holes: [scratch] };
    expect(nestFaults(flawed, [at(5, 20)])).toEqual([{ piece: 0, what: 'over a flaw' }]);
    expect(nestFaults(flawed, [at(5, 26)])).toEqual([]);
    const notched = [
      at(0, 0),
      at(100, 0),
      at(100, 100),
      at(52, 100),
      at(50, 30),
      at(48, 100),
      at(0, 100),
    ];
    const side: NestProblem = { ...problem, container: { type: 'polygon', points: notched } };
    expect(nestFaults(side, [at(30, 40)])).toEqual([{ piece: 0, what: 'outside' }]);
    expect(nestFaults(side, [at(30, 5)])).toEqual([]);
  });
});
