import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Exact } from '../numbers/decimal-text.ts';
import { shareService } from './share-service.ts';

const lot = (areaMm2: string, asked: string | null = null) => ({ areaMm2, asked });

describe('what came back from a service', () => {
  it('bears what the leather had cost and what the work cost', () => {
    const cost = { material: '235.60', goods: '37.20' };
    expect(shareService(cost, [lot('2303995.392')])).toEqual([cost]);
  });

  it('is shared by area between the grain and the flesh of a side that was split', () => {
    const shares = shareService({ material: '100.01', goods: '30.00' }, [lot('3'), lot('1')]);
    expect(shares).toEqual([
      { material: '75.01', goods: '22.50' },
      { material: '25.00', goods: '7.50' },
    ]);
  });

  it('bears what was asked for it, and the others what is left of the work', () => {
    const cost = { material: '90.00', goods: '30.00' };
    const goods = (...lots: ReturnType<typeof lot>[]) =>
      shareService(cost, lots).map((share) => share.goods);
    expect(goods(lot('1', '12.00'), lot('2'), lot('1'))).toEqual(['12.00', '12.00', '6.00']);
    expect(goods(lot('1', '45.00'), lot('2'))).toEqual(['45.00', '0.00']);
    expect(goods(lot('1', '45.00'), lot('2', '1.00'))).toEqual(['45.00', '1.00']);
  });

  it('loses no cent, whatever came back', () => {
    const cents = fc.integer({ min: 0, max: 1e9 }).map((whole) => (whole / 100).toFixed(2));
    const areas = fc.array(fc.integer({ min: 1, max: 1e9 }), { minLength: 1, maxLength: 12 });
    fc.assert(
      fc.property(cents, cents, areas, (material, goods, all) => {
        const shares = shareService(
          { material, goods },
          all.map((area) => lot(String(area))),
        );
        const sum = (of: 'material' | 'goods') =>
          Exact.sum(0, ...shares.map((share) => share[of])).toFixed(2);
        expect([sum('material'), sum('goods')]).toEqual([material, goods]);
      }),
    );
  });

  it('is refused where nothing came back, or for less than nothing', () => {
    expect(() => shareService({ material: '1.00', goods: '1.00' }, [])).toThrow();
    expect(() => shareService({ material: '1.00', goods: '-1.00' }, [lot('1')])).toThrow();
    expect(() => shareService({ material: '1.00', goods: '1.00' }, [lot('1', '-1.00')])).toThrow();
  });
});
