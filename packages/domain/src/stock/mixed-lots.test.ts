import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { mixedWith, type LotOfOrder } from './mixed-lots.ts';

const lot = (lotId: number, shade = '', sideId = lotId): LotOfOrder => ({
  lotId,
  tag: `T-${lotId}`,
  shade,
  sideId,
});

describe('lots that would mix in an order', () => {
  it('says nothing of the first lot, nor of an offcut of the same side', () => {
    expect(mixedWith(lot(1, 'tan'), [])).toBeNull();
    expect(mixedWith(lot(2, 'tan', 1), [lot(1, 'dark tan')])).toBeNull();
  });

  it('names the shades where they are noted and differ', () => {
    const mix = mixedWith(lot(1, 'tan'), [lot(2, 'dark tan'), lot(3, 'tan')]);
    expect(mix?.of).toBe('shades');
    expect(mix?.sentence).toContain('T-1 is tan, and this order has T-2 (dark tan).');
  });

  it('names the other side where shades agree or nobody noted them', () => {
    expect(mixedWith(lot(1, 'tan'), [lot(2, 'tan')])).toMatchObject({ of: 'lots' });
    expect(mixedWith(lot(1, 'tan'), [lot(2, 'tan')])?.sentence).toContain('Both are noted as tan');
    expect(mixedWith(lot(1), [lot(2, 'tan'), lot(3)])?.sentence).toMatch(
      /^T-1 is another side than T-2 and T-3/,
    );
    expect(mixedWith(lot(1, 'tan'), [lot(2)])?.sentence).toContain('not all noted');
  });

  it('is mutual: whichever of two lots comes second, the same is said to mix', () => {
    const any = fc.record({
      lotId: fc.constantFrom(1, 2),
      shade: fc.constantFrom('', 'tan', 'dark tan'),
      sideId: fc.constantFrom(7, 8),
    });
    fc.assert(
      fc.property(any, any, (a, b) => {
        const [one, two] = [lot(a.lotId, a.shade, a.sideId), lot(b.lotId, b.shade, b.sideId)];
        expect(mixedWith(one, [two])?.of).toBe(mixedWith(two, [one])?.of);
      }),
    );
  });
});
