import { describe, expect, it } from 'vitest';
import { InvalidInput, NotWorkable } from '../errors/domain-error.ts';
import { planRegular } from './plan-regular.ts';
import type { NestProblem } from './problem.ts';

const square = [
  { x: 0, y: 0 },
  { x: 20, y: 0 },
  { x: 20, y: 20 },
  { x: 0, y: 20 },
];
const sound: NestProblem = {
  outline: square,
  container: { type: 'rect', w: 100, h: 100 },
  gap: 1,
  rotations: [0],
};
const bowTie = [square[0]!, square[2]!, square[1]!, square[3]!];
const flat = [square[0]!, { x: 10, y: 0 }, square[1]!];
const many = Array.from({ length: 100_000 }, (_, at) => ({
  x: 50 * Math.cos((at * Math.PI) / 50_000),
  y: 50 * Math.sin((at * Math.PI) / 50_000),
}));

describe('a problem that cannot be laid out', () => {
  it.each<[Partial<NestProblem>, string, RegExp]>([
    [{ outline: bowTie }, 'outline', /cross itself: near \(10\.00, 10\.00\)/],
    [{ outline: flat }, 'outline', /encloses none/],
    [{ outline: square.slice(0, 2) }, 'outline', /at least three corners/],
    [{ outline: many }, 'outline', /it has 100000/],
    [{ outline: [...square, { x: NaN, y: 1 }] }, 'outline.4', /corner 4/],
    [{ outline: [...square, { x: 0, y: Infinity }] }, 'outline.4', /corner 4/],
    [{ outline: [...square, { x: 10, y: 0 }] }, 'outline', /cross itself/],
    [{ gap: NaN }, 'gap', /0 to 100/],
    [{ gap: -1 }, 'gap', /0 to 100/],
    [{ trim: 101 }, 'trim', /0 to 100/],
    [{ flawClearance: -0.1 }, 'flawClearance', /0 to 100/],
    [{ rotations: [] }, 'rotations', /1 to 36/],
    [{ rotations: [NaN] }, 'rotations', /1 to 36/],
    [{ container: { type: 'rect', w: 0, h: 10 } }, 'container.w', /to 20000/],
    [{ container: { type: 'strip', width: NaN } }, 'container.width', /to 20000/],
    [{ container: { type: 'strip', width: 50, qty: 0 } }, 'container.qty', /1 to 20000/],
    [{ container: { type: 'polygon', points: bowTie } }, 'container.points', /cross itself/],
    [{ holes: [flat] }, 'holes.0', /encloses none/],
  ])('%#. is refused by name', (part, field, sentence) => {
    const attempt = () => planRegular({ ...sound, ...part });
    expect(attempt).toThrow(InvalidInput);
    expect(attempt).toThrow(sentence);
    expect(attempt).toThrow(expect.objectContaining({ field }));
  });

  it('is refused when the picture alone would be too large', () => {
    const container = { type: 'rect' as const, w: 5000, h: 5000 };
    expect(() => planRegular({ ...sound, container })).toThrow(NotWorkable);
  });
});
