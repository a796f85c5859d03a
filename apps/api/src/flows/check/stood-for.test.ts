import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { withoutStoodFor } from './stood-for.ts';

const [iron, brass, nickel, cap, post] = [1, 2, 3, 4, 5];
const alone = (hardwareId: number) => ({ name: '', parts: [{ hardwareId, quantity: 1 }] });
const kit = {
  name: 'kit',
  parts: [
    { hardwareId: cap, quantity: 1 },
    { hardwareId: post, quantity: 2 },
  ],
};
const has =
  (counts: Record<number, number>) =>
  ({ jobId, hardwareId }: { jobId: number; hardwareId: number }) =>
    jobId === 7 ? (counts[hardwareId] ?? 0) : 0;
const lack = (hardwareId: number, quantity: number, jobId = 7) => ({ jobId, hardwareId, quantity });

describe('what a job has in place of what it lacks', () => {
  it('is owed no more, and only to that job', () => {
    const owed = withoutStoodFor(
      [lack(iron, 20), lack(iron, 20, 8)],
      () => [alone(brass)],
      has({ [brass]: 12 }),
    );
    expect(owed).toEqual([lack(iron, 8), lack(iron, 20, 8)]);
  });

  it('counts once where two lines could have it', () => {
    const lacking = [lack(iron, 10), lack(nickel, 10)];
    const owed = withoutStoodFor(lacking, () => [alone(brass)], has({ [brass]: 12 }));
    expect(owed).toEqual([lack(nickel, 8)]);
  });

  it('counts of a kit only what its parts make up', () => {
    const owed = withoutStoodFor([lack(iron, 10)], () => [kit], has({ [cap]: 9, [post]: 7 }));
    expect(owed).toEqual([lack(iron, 7)]);
  });

  it('adds nothing where the job has less than it needs itself', () => {
    const owed = withoutStoodFor([lack(iron, 10)], () => [alone(brass)], has({ [brass]: -4 }));
    expect(owed).toEqual([lack(iron, 10)]);
  });

  it('never takes off more than the job has', () => {
    const counts = fc.array(fc.integer({ min: 1, max: 50 }), { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(counts, fc.integer({ min: 0, max: 120 }), (lacks, spare) => {
        const lacking = lacks.map((quantity) => lack(iron, quantity));
        const owed = withoutStoodFor(lacking, () => [alone(brass)], has({ [brass]: spare }));
        const sum = (rows: { quantity: number }[]) =>
          rows.reduce((total, { quantity }) => total + quantity, 0);
        expect(sum(owed)).toBe(Math.max(0, sum(lacking) - spare));
      }),
    );
  });
});
