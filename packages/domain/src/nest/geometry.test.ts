import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { minkowskiSum } from './convolution.ts';
import { upperEnvelope } from './envelope.ts';
import { linearStep } from './linear-step.ts';
import { anOutlineRing } from './nest.arbitrary.ts';
import { PhaseSearch } from './phase.ts';
import { counterClockwise, isInside, mirroredThroughOrigin, shifted, signedArea } from './ring.ts';
import { seeded } from './seeded.ts';
import { StepCurve } from './step-curve.ts';
import { commonArea } from '../outline/clip.ts';

const runs = { numRuns: 30, seed: 9 };

describe('the no-fit polygon', () => {
  it('holds just the places where two outlines overlap', () => {
    fc.assert(
      fc.property(anOutlineRing, anOutlineRing, fc.integer({ min: 1, max: 1e6 }), (a, b, seed) => {
        const [first, second] = [counterClockwise(a), counterClockwise(b)];
        const rings = minkowskiSum(first, mirroredThroughOrigin(second));
        const chance = seeded(seed);
        for (let turn = 0; turn < 10; turn += 1) {
          const [x, y] = [240 * chance() - 120, 240 * chance() - 120];
          const common = commonArea(first, shifted(second, x, y));
          // Right at the boundary rounding decides.
          if (common > 1e-3) expect(isInside(rings, x, y)).toBe(true);
          if (isInside(rings, x, y)) expect(common).toBeGreaterThan(0);
        }
      }),
      runs,
    );
  });

  it('of convex outlines has the area A + B + 2 · mixed area: of a square with itself four squares', () => {
    const square = [
      { x: 0, y: 0 },
      { x: 3, y: 0 },
      { x: 3, y: 3 },
      { x: 0, y: 3 },
    ];
    const [sum] = minkowskiSum(square, square);
    expect(signedArea(sum!)).toBeCloseTo(36, 9);
  });
});

describe('a linear step', () => {
  it('finds the best corner', () => {
    // Least x + y with x ≥ −2, x + 2y ≥ −3 and both within 4.
    const step = linearStep(
      [1, 1],
      [
        { by: [1, 0], least: -2 },
        { by: [1, 2], least: -3 },
      ],
      4,
    );
    expect(step).toEqual([expect.closeTo(-2, 9), expect.closeTo(-0.5, 9)]);
  });

  it('goes as far as it may where nothing stops it, and says when nothing is possible', () => {
    expect(linearStep([1, -1], [], 2)).toEqual([-2, 2]);
    expect(linearStep([1], [{ by: [1], least: 3 }], 2)).toBeNull();
  });
});

describe('envelopes and steps between rows', () => {
  it('take the highest of crossing pieces', () => {
    expect(upperEnvelope([0, 0, 4, 4, 0, 2, 4, 2])).toEqual([0, 2, 2, 2, 2, 2, 4, 4]);
  });

  it('repeat with the pitch', () => {
    const roof = [-5, 0, 0, 5, 0, 5, 5, 0];
    const curve = new StepCurve(roof, 6);
    expect(curve.at(0)).toBeCloseTo(5, 9);
    expect(curve.at(3)).toBeCloseTo(2, 9);
    expect(curve.at(-3)).toBeCloseTo(2, 9);
    expect(curve.minima()[0]).toEqual({
      shift: expect.closeTo(3, 9),
      height: expect.closeTo(2, 9),
    });
  });
});

describe('laying a pattern over a room', () => {
  it('counts as many pieces as it lays, all inside, and no fewer than by chance', () => {
    fc.assert(
      fc.property(anOutlineRing, fc.integer({ min: 1, max: 1e6 }), (outline, seed) => {
        const room = [counterClockwise(outline)];
        const crystal = {
          along: { x: 9, y: 1 },
          across: { x: -3, y: 8 },
          members: [{ turn: 0 as const, at: { x: 0, y: 0 } }],
        };
        const search = new PhaseSearch(crystal, [room]);
        const phase = search.best(200);
        const laid = search.placements(phase, [0]);
        expect(laid).toHaveLength(phase.count);
        for (const { x, y } of laid) expect(isInside(room, x, y)).toBe(true);
        const chance = seeded(seed);
        const [dx, dy] = [9 * chance(), 8 * chance()];
        let others = 0;
        for (let i = -20; i < 20; i += 1) {
          for (let j = -20; j < 20; j += 1) {
            if (isInside(room, dx + 9 * i - 3 * j, dy + i + 8 * j)) others += 1;
          }
        }
        expect(phase.count).toBeGreaterThanOrEqual(others - 1);
      }),
      runs,
    );
  });
});
