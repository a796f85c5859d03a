import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Exact } from '../numbers/decimal-text.ts';
import { carriageBases, shareCarriage, type CarriedLine } from './share-carriage.ts';

const side = (goods: string, areaMm2: string): CarriedLine => ({ goods, areaMm2, quantity: null });
const rivets = (goods: string, quantity: number): CarriedLine => ({
  goods,
  areaMm2: null,
  quantity,
});

const cents = (max: number) => fc.integer({ min: 0, max }).map((whole) => (whole / 100).toFixed(2));
const aLine = fc.oneof(
  fc
    .tuple(cents(1e8), fc.integer({ min: 1, max: 1e9 }))
    .map(([goods, area]) => side(goods, String(area))),
  fc
    .tuple(cents(1e8), fc.integer({ min: 1, max: 1e6 }))
    .map(([goods, count]) => rivets(goods, count)),
);

describe('freight and duty', () => {
  it('are shared by what each line cost', () => {
    const lines = [side('210.38', '2299350.24'), rivets('162.50', 1000)];
    expect(shareCarriage('18.00', lines, 'value')).toEqual(['10.16', '7.84']);
  });

  it('are borne by the leather alone when shared by area, by the hardware alone by count', () => {
    const lines = [side('0.00', '3'), side('9.00', '1'), rivets('5.00', 200)];
    expect(shareCarriage('10.00', lines, 'area')).toEqual(['7.50', '2.50', '0.00']);
    expect(shareCarriage('10.00', lines, 'count')).toEqual(['0.00', '0.00', '10.00']);
  });

  it('lose no cent, whatever they are shared by', () => {
    fc.assert(
      fc.property(
        cents(1e7),
        fc.array(aLine, { minLength: 1, maxLength: 40 }),
        fc.constantFrom(...carriageBases),
        (amount, lines, by) => {
          const bears = lines.some(
            (line) =>
              Number(by === 'value' ? line.goods : by === 'area' ? line.areaMm2 : line.quantity) >
              0,
          );
          fc.pre(bears || amount === '0.00');
          const parts = shareCarriage(amount, lines, by);
          expect(parts).toHaveLength(lines.length);
          expect(Exact.sum(0, ...parts).eq(amount)).toBe(true);
          expect(parts.every((part) => !part.startsWith('-'))).toBe(true);
        },
      ),
    );
  });

  it('are refused where nothing can bear them, and of nothing there is nothing to share', () => {
    expect(() => shareCarriage('1.00', [rivets('1.00', 5)], 'area')).toThrow('No leather came');
    expect(() => shareCarriage('1.00', [side('1.00', '5')], 'count')).toThrow('No hardware came');
    expect(() => shareCarriage('1.00', [side('0.00', '5')], 'value')).toThrow(
      expect.objectContaining({ field: 'sharedBy' }),
    );
    expect(shareCarriage('0', [side('0.00', '5')], 'value')).toEqual(['0.00']);
    expect(() => shareCarriage('-1.00', [side('1.00', '5')], 'value')).toThrow();
  });
});
