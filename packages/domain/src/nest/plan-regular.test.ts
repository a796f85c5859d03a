import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Point } from '../outline/outline.ts';
import { nestBounds, nestWastes } from './bounds.ts';
import { nestFaults } from './nest-faults.ts';
import { anOutlineRing, aPanelProblem } from './nest.arbitrary.ts';
import { planRegular } from './plan-regular.ts';
import type { NestProblem } from './problem.ts';
import { turned } from './ring.ts';

const runs = { numRuns: 10, seed: 3 };
const count = (problem: NestProblem) => planRegular(problem).placements.length;

const tag: Point[] = [
  { x: 0, y: 0 },
  { x: 34, y: 10 },
  { x: 60, y: 6 },
  { x: 76, y: 12 },
  { x: 60, y: 30 },
  { x: 34, y: 24 },
  { x: 0, y: 34 },
];

describe('a regular plan', () => {
  it('can be cut, gives no more than the bound, and is the same every time', () => {
    fc.assert(
      fc.property(aPanelProblem, (problem) => {
        const plan = planRegular(problem);
        expect(nestFaults(problem, plan.placements)).toEqual([]);
        expect(plan.placements.length).toBeLessThanOrEqual(nestBounds(problem).pieces ?? 0);
        expect(planRegular(problem)).toEqual(plan);
      }),
      runs,
    );
  });

  it('gives no fewer pieces from a larger panel, and no more with more spacing', () => {
    fc.assert(
      fc.property(anOutlineRing, fc.constantFrom([0], [0, 180]), (outline, rotations) => {
        const asked = (w: number, h: number, gap: number): NestProblem => ({
          outline,
          container: { type: 'rect', w, h },
          gap,
          rotations,
        });
        const first = count(asked(260, 300, 1));
        expect(count(asked(300, 300, 1))).toBeGreaterThanOrEqual(first);
        expect(count(asked(260, 345, 1))).toBeGreaterThanOrEqual(first);
        expect(count(asked(260, 300, 3))).toBeLessThanOrEqual(first);
      }),
      runs,
    );
  });

  it('is the same when panel and outline are turned by a quarter together', () => {
    fc.assert(
      fc.property(anOutlineRing, (outline) => {
        const lying: NestProblem = {
          outline,
          container: { type: 'rect', w: 250, h: 310 },
          gap: 1,
          rotations: [0, 180],
        };
        const standing: NestProblem = {
          ...lying,
          outline: turned(outline, 90),
          container: { type: 'rect', w: 310, h: 250 },
        };
        expect(count(standing)).toBe(count(lying));
      }),
      runs,
    );
  });

  it('of a strip repeats after its period, and stays within the strip', () => {
    fc.assert(
      fc.property(anOutlineRing, fc.integer({ min: 70, max: 160 }), (outline, width) => {
        const problem: NestProblem = {
          outline,
          container: { type: 'strip', width, qty: 30 },
          gap: 1,
          rotations: [0, 180],
        };
        const { placements, period, mmPerPiece } = planRegular(problem);
        expect(nestFaults(problem, placements)).toEqual([]);
        if (!period) return;
        expect(placements.length).toBeGreaterThanOrEqual(30);
        expect(mmPerPiece).toBeCloseTo(period.mm / period.pieces, 9);
        expect(mmPerPiece).toBeGreaterThan(nestBounds(problem).mmPerPiece ?? 0);
        placements.slice(period.pieces).forEach((later, at) => {
          const { x, y, rot } = placements[at]!;
          expect([later.x, later.y, later.rot]).toEqual([
            expect.closeTo(x + period.mm, 6),
            expect.closeTo(y, 6),
            rot,
          ]);
        });
      }),
      runs,
    );
  });

  it('keeps flaws of a side clear, with their clearance', () => {
    const points = [
      { x: 0, y: 40 },
      { x: 300, y: 0 },
      { x: 620, y: 60 },
      { x: 580, y: 400 },
      { x: 250, y: 460 },
      { x: 30, y: 380 },
    ];
    const scratch = [
      { x: 200, y: 200 },
      { x: 420, y: 210 },
      { x: 420, y: 212 },
      { x: 200, y: 203 },
    ];
    const problem: NestProblem = {
      outline: tag,
      container: { type: 'polygon', points },
      holes: [scratch],
      flawClearance: 4,
      trim: 3,
      gap: 1.5,
      rotations: [0, 180],
    };
    const plan = planRegular(problem);
    expect(nestFaults(problem, plan.placements)).toEqual([]);
    expect(plan.placements.length).toBeGreaterThan(60);
    expect(plan.placements.length).toBeLessThan(count({ ...problem, holes: [] }));
  });

  // Common practice, no source: a small article that nests by turning every other one gives about
  // 18 to 21 pieces from an 11 × 13 inch panel, 21 as three rows of seven; one that looks wasteful
  // alone nests well when every other one is turned.
  it('gets 18 to 21 wedges from an 11 × 13 inch panel by turning every other one', () => {
    const wedge = [
      { x: -22, y: 0 },
      { x: 22, y: 0 },
      { x: 30, y: 90 },
      { x: -30, y: 90 },
    ];
    const panel: NestProblem = {
      outline: wedge,
      container: { type: 'rect', w: 330.2, h: 279.4 },
      gap: 1,
      rotations: [0, 180],
    };
    const pieces = count(panel);
    expect(pieces).toBeGreaterThanOrEqual(18);
    expect(pieces).toBeLessThanOrEqual(21);
    expect(pieces).toBeGreaterThan(count({ ...panel, rotations: [0] }));
  });

  it('says where the rest of the panel goes', () => {
    const outline = [
      { x: 0, y: 0 },
      { x: 40, y: 0 },
      { x: 0, y: 30 },
    ];
    const problem: NestProblem = {
      outline,
      container: { type: 'rect', w: 100, h: 100 },
      gap: 0,
      rotations: [0],
    };
    const plan = planRegular(problem);
    const wastes = nestWastes(problem, plan)!;
    expect(wastes.perCellMm2).toBeGreaterThan(0);
    const cells = plan.placements.length * (600 + wastes.perCellMm2);
    expect(wastes.edgesMm2).toBeCloseTo(Math.max(0, 10_000 - cells), 6);
  });

  it('is honest about what does not fit', () => {
    const panel = { outline: tag, gap: 0, rotations: [0] };
    expect(count({ ...panel, container: { type: 'rect', w: 70, h: 300 } })).toBe(0);
    expect(count({ ...panel, container: { type: 'rect', w: 300, h: 33 } })).toBe(0);
    expect(count({ ...panel, container: { type: 'strip', width: 30 } })).toBe(0);
    const points = [
      { x: 0, y: 0 },
      { x: 400, y: 0 },
      { x: 400, y: 300 },
      { x: 0, y: 300 },
    ];
    const side: NestProblem = { ...panel, container: { type: 'polygon', points } };
    expect(count(side)).toBeGreaterThan(20);
    const covered = points.map(({ x, y }) => ({ x: x * 1.1 - 10, y: y * 1.1 - 10 }));
    expect(count({ ...side, holes: [covered] })).toBe(0);
    expect(count({ ...side, trim: 100, flawClearance: 50, holes: [points] })).toBe(0);
  });

  it('lets a piece that fits exactly lie there', () => {
    const outline = [
      { x: 5, y: 5 },
      { x: 12, y: 5 },
      { x: 12, y: 8 },
      { x: 5, y: 8 },
    ];
    const at = (w: number, h: number): NestProblem => ({
      outline,
      container: { type: 'rect', w, h },
      gap: 0,
      rotations: [0],
    });
    expect(count(at(7, 3))).toBe(1);
    expect(count(at(28, 9))).toBe(12);
    expect(count(at(27.99, 9))).toBe(9);
  });
});
