import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reorderPoint } from './reorder-point.ts';

const amount = fc.integer({ min: 0, max: 5000 }).map((tenths) => tenths / 10);
const over = fc.record({
  demandMean: amount,
  demandSd: amount,
  leadMean: amount,
  leadSd: amount,
});

describe('reorderPoint', () => {
  it('never keeps less for a better service', () => {
    const aService = fc.integer({ min: 1, max: 9998 }).map((value) => value / 10_000);
    fc.assert(
      fc.property(over, aService, (each, service) => {
        const better = reorderPoint({ ...each, service: service + 0.0001 });
        expect(better.safety).toBeGreaterThanOrEqual(reorderPoint({ ...each, service }).safety);
        expect(better.point - better.safety).toBeCloseTo(each.demandMean * each.leadMean, 6);
      }),
    );
  });

  it('needs no safety where nothing varies, or where half the time will do', () => {
    fc.assert(
      fc.property(over, (each) => {
        const steady = { ...each, demandSd: 0, leadSd: 0 };
        expect(reorderPoint({ ...steady, z: 2 }).safety).toBe(0);
        expect(reorderPoint({ ...each, service: 0.5 }).safety).toBeCloseTo(0, 9);
      }),
    );
  });

  it.each([
    ['demandMean', { demandMean: -1 }],
    ['demandSd', { demandSd: -1 }],
    ['leadMean', { leadMean: Number.NaN }],
    ['leadSd', { leadSd: -1 }],
    ['service', { service: 1 }],
    ['service', { service: 95 }],
  ])('refuses %s where it makes no sense', (field, change) => {
    const asked = { demandMean: 1, demandSd: 1, leadMean: 1, leadSd: 1, service: 0.9 };
    expect(() => reorderPoint({ ...asked, ...change })).toThrow(expect.objectContaining({ field }));
  });

  it('takes a z below zero as the service below one half that it is', () => {
    const asked = { demandMean: 10, demandSd: 3, leadMean: 4, leadSd: 0 };
    // 10 × 4 - 1.65 × 3 × 2, by hand
    expect(reorderPoint({ ...asked, z: -1.65 }).point).toBeCloseTo(30.1, 9);
    const byService = reorderPoint({ ...asked, service: 0.3 });
    expect(reorderPoint({ ...asked, z: -0.5244005127080407 }).safety).toBeCloseTo(
      byService.safety,
      6,
    );
  });
});
