import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chooseLots, shadesOf, type LotOffer } from './choose-lots.ts';

const lot = (lotId: number, pieces: number, receivedOn: string, shade = ''): LotOffer => ({
  lotId,
  pieces,
  receivedOn,
  shade,
});

describe('chooseLots', () => {
  const ids = (lots: LotOffer[], needed: number, like: string | null = null) =>
    chooseLots(lots, needed, like).map(({ lotId }) => lotId);
  const rack = [
    lot(1, 3, '2027-01-04'),
    lot(2, 12, '2027-02-01'),
    lot(3, 9, '2027-01-20'),
    lot(4, 15, '2027-03-01'),
  ];

  it('prefers one lot that holds it all, the oldest such', () => {
    expect(ids(rack, 8)).toEqual([3]);
    expect(ids(rack, 10)).toEqual([2]);
  });

  it('else takes as few as possible, older ones first', () => {
    expect(ids(rack, 20)).toEqual([3, 2]);
    expect(ids(rack, 27)).toEqual([2, 4]);
  });

  const shaded = [
    lot(1, 10, '2027-01-04', 'red-brown'),
    lot(2, 12, '2027-02-01', 'lighter'),
    lot(3, 9, '2027-03-01', 'red-brown'),
    lot(4, 30, '2027-04-01', 'dark'),
  ];

  it('keeps a reorder in the shade of the earlier lot where that holds it', () => {
    expect(ids(shaded, 15, 'red-brown')).toEqual([1, 3]);
    expect(ids(shaded, 25, 'red-brown')).toEqual([4]);
    expect(ids(shaded, 8, 'lighter')).toEqual([2]);
    expect(ids(shaded, 8, 'green')).toEqual([1]);
  });

  it('keeps to one shade before it mixes two', () => {
    const without = shaded.slice(0, 3);
    expect(ids(without, 18)).toEqual([1, 3]);
    expect(shadesOf(without, chooseLots(without, 18))).toEqual(['red-brown']);
    expect(shadesOf(without, chooseLots(without, 22))).toEqual(['red-brown', 'lighter']);
  });

  it('takes exactly what is needed, never more than a lot gives, where there is enough', () => {
    const someLots = fc.array(
      fc.tuple(
        fc.integer({ min: 0, max: 30 }),
        fc.integer({ min: 10, max: 28 }),
        fc.constantFrom('', 'pale', 'dark'),
      ),
      { maxLength: 8 },
    );
    const like = fc.constantFrom(null, '', 'pale');
    fc.assert(
      fc.property(someLots, fc.integer({ min: 0, max: 120 }), like, (sizes, needed, shade) => {
        const lots = sizes.map(([pieces, day, its], at) => lot(at, pieces, `2027-02-${day}`, its));
        const takes = chooseLots(lots, needed, shade);
        const all = sizes.reduce((sum, [pieces]) => sum + pieces, 0);
        expect(takes.reduce((sum, { pieces }) => sum + pieces, 0)).toBe(Math.min(all, needed));
        for (const take of takes) {
          expect(take.pieces).toBeLessThanOrEqual(lots[take.lotId]?.pieces ?? 0);
        }
        if (lots.some(({ pieces }) => pieces >= needed) && shade !== 'pale') {
          expect(takes.length).toBeLessThanOrEqual(1);
        }
      }),
    );
  });
});
