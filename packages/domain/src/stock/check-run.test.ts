import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Exact } from '../numbers/decimal-text.ts';
import { checkRun, type CheckInput } from './check-run.ts';
import { chooseLots, type FreeLot } from './choose-lots.ts';

const ft2 = (feet: number): string => new Exact('92903.04').times(feet).toFixed();
const lot = (lotId: number, feet: number, receivedOn: string): FreeLot => ({
  lotId,
  tag: `L-${lotId}`,
  freeAreaMm2: ft2(feet),
  receivedOn,
});

const enough: CheckInput = {
  leather: { name: 'Russet side', neededAreaMm2: ft2(8), lots: [lot(1, 20, '2027-01-04')] },
  hardware: [{ name: 'Rivet', needed: 100, free: 100 }],
  tooling: [{ name: 'Coaster die', inShop: true, strikesNeeded: 100, strikesLeft: 5000 }],
  hours: { day: '2027-03-05', neededMinutes: '150', freeMinutes: '600' },
};

describe('Can we make it?', () => {
  it('says yes where everything is there, and what to take', () => {
    const { ok, answers } = checkRun(enough);
    expect(ok).toBe(true);
    expect(answers.map(({ sentence }) => sentence)).toEqual([
      'Russet side: take 8.0 ft² from L-1.',
      'Rivet: take 100 of 100 free.',
      'Coaster die: ready, 5,000 strikes left in it.',
      'Bench hours: 2.5 of the 10 free by 2027-03-05.',
    ]);
  });

  it('names exactly what is short', () => {
    const { ok, answers } = checkRun({
      leather: { name: 'Russet side', neededAreaMm2: ft2(25), lots: [lot(1, 20, '2027-01-04')] },
      hardware: [{ name: 'Rivet', needed: 100, free: 99 }],
      tooling: [
        { name: 'Coaster die', inShop: true, strikesNeeded: 100, strikesLeft: 40 },
        { name: 'Heron plate', inShop: false, strikesNeeded: 100, strikesLeft: null },
      ],
      hours: { day: '2027-03-05', neededMinutes: '630', freeMinutes: '600' },
    });
    expect(ok).toBe(false);
    expect(answers.every((answer) => !answer.ok)).toBe(true);
    expect(answers.map(({ sentence }) => sentence)).toEqual([
      'Russet side: 25.0 ft² needed, 20.0 ft² free, 5.0 ft² short.',
      'Rivet: 100 needed, 99 free, 1 short.',
      'Coaster die: 100 strikes needed, 40 left in it: order a new one.',
      'Heron plate: not in the shop yet.',
      'Bench hours: 10.5 needed by 2027-03-05, 10 free, 0.5 short.',
    ]);
    expect(answers.map(({ short }) => short)).toEqual([ft2(5), '1', '60', '100', '30']);
  });

  it('refuses counts that make no sense', () => {
    const hardware = [{ name: 'Rivet', needed: -1, free: 5 }];
    expect(() => checkRun({ ...enough, hardware })).toThrow(
      expect.objectContaining({ field: 'hardware.0.needed' }),
    );
  });
});

describe('chooseLots', () => {
  const tags = (lots: FreeLot[], feet: number) => chooseLots(lots, ft2(feet)).map(({ tag }) => tag);
  const rack = [
    lot(1, 3, '2027-01-04'),
    lot(2, 12, '2027-02-01'),
    lot(3, 9, '2027-01-20'),
    lot(4, 15, '2027-03-01'),
  ];

  it('prefers one lot that holds it all, the oldest such', () => {
    expect(tags(rack, 8)).toEqual(['L-3']);
    expect(tags(rack, 10)).toEqual(['L-2']);
  });

  it('else takes as few as possible, older ones first', () => {
    expect(tags(rack, 20)).toEqual(['L-3', 'L-2']);
    expect(tags(rack, 27)).toEqual(['L-2', 'L-4']);
  });

  it('takes exactly what is needed, never more than a lot has, where there is enough', () => {
    const someLots = fc.array(
      fc.tuple(fc.integer({ min: 0, max: 30 }), fc.integer({ min: 10, max: 28 })),
      { maxLength: 8 },
    );
    fc.assert(
      fc.property(someLots, fc.integer({ min: 0, max: 120 }), (sizes, needed) => {
        const lots = sizes.map(([feet, day], at) => lot(at, feet, `2027-02-${day}`));
        const takes = chooseLots(lots, ft2(needed));
        const taken = takes.reduce((sum, take) => sum.plus(take.takeAreaMm2), new Exact(0));
        const all = sizes.reduce((sum, [feet]) => sum + feet, 0);
        expect(taken.eq(ft2(Math.min(all, needed)))).toBe(true);
        for (const take of takes) {
          expect(new Exact(take.takeAreaMm2).lte(lots[take.lotId]?.freeAreaMm2 ?? 0)).toBe(true);
        }
      }),
    );
  });
});
