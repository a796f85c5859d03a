import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { benchMinutes, goodShare } from './bench-minutes.ts';
import { ticketSteps, type WorkPlan, type WorkStep } from './work-plan.ts';

const step = (change: Partial<WorkStep>): WorkStep => ({
  name: 'Cut',
  setupMinutes: '0',
  secondsPerUnit: '60',
  per: 'piece',
  rejectPercent: '0',
  ...change,
});

const plan: WorkPlan = {
  kind: 'steps',
  steps: [
    step({ name: 'Case', per: 'panel', secondsPerUnit: '120' }),
    step({
      name: 'Strike',
      per: 'strike',
      secondsPerUnit: '30',
      setupMinutes: '10',
      rejectPercent: '10',
    }),
    step({ name: 'Cut', secondsPerUnit: '6', rejectPercent: '5' }),
    step({ name: 'Clear up', per: 'run', secondsPerUnit: '900' }),
  ],
};

describe('benchMinutes', () => {
  it('counts each step by its own unit, and pieces as the steps before left them', () => {
    expect(benchMinutes(plan, { pieces: 100, containers: 5 })).toEqual({
      total: '94',
      bySteps: [
        { name: 'Case', units: '5', minutes: '10' },
        { name: 'Strike', units: '100', minutes: '60' },
        { name: 'Cut', units: '90', minutes: '9' },
        { name: 'Clear up', units: '1', minutes: '15' },
      ],
    });
  });

  it('takes minutes per 100 as they are', () => {
    const simple: WorkPlan = { kind: 'minutesPer100', minutes: '150', rejectPercent: '10' };
    expect(benchMinutes(simple, { pieces: 20, containers: 1 }).total).toBe('30');
    expect(ticketSteps(simple)).toEqual([
      step({ name: 'Make', secondsPerUnit: '90', rejectPercent: '10' }),
    ]);
    expect(goodShare(simple)).toBe(0.9);
  });

  it('never takes less for more pieces', () => {
    fc.assert(
      fc.property(fc.nat(5000), fc.nat(500), (pieces, more) => {
        const minutes = (count: number) =>
          Number(benchMinutes(plan, { pieces: count, containers: 3 }).total);
        expect(minutes(pieces + more)).toBeGreaterThanOrEqual(minutes(pieces));
      }),
    );
  });
});

describe('a work plan', () => {
  it('lets through the share that every step lets through', () => {
    expect(goodShare(plan)).toBe(0.855);
  });

  it.each([
    ['steps', { kind: 'steps', steps: [] }],
    ['steps.0.per', { kind: 'steps', steps: [step({ per: 'side' as 'piece' })] }],
    ['steps.0.rejectPercent', { kind: 'steps', steps: [step({ rejectPercent: '100' })] }],
    ['steps.0.secondsPerUnit', { kind: 'steps', steps: [step({ secondsPerUnit: '-1' })] }],
    ['minutes', { kind: 'minutesPer100', minutes: 'NaN', rejectPercent: '0' }],
  ] satisfies [string, WorkPlan][])('is refused where %s makes no sense', (field, bad) => {
    expect(() => ticketSteps(bad)).toThrow(expect.objectContaining({ field }));
  });
});
