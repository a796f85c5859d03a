import fc from 'fast-check';
import { expect, it } from 'vitest';
import { priceFromFt2, pricePerFt2 } from './area-price.ts';

it('turns the price of a dm² or a m² into that of a ft², 9.290304 dm²', () => {
  expect(pricePerFt2('1', 'dm2')).toBe('9.2903');
  expect(pricePerFt2('102', 'm2')).toBe('9.4761');
  expect(priceFromFt2('9.4761', 'm2')).toBe('102');
  expect(priceFromFt2('9.5', 'ft2')).toBe('9.5');
});

it('shows again what was typed, to the cent', () => {
  const cents = fc.integer({ min: 0, max: 10_000_000 }).map((n) => n / 100);
  fc.assert(
    fc.property(cents, fc.constantFrom('ft2', 'dm2', 'm2'), (price, per) => {
      const again = priceFromFt2(pricePerFt2(price.toFixed(2), per), per);
      expect(Number(again)).toBeCloseTo(price, per === 'dm2' ? 4 : 2);
    }),
  );
});

it('refuses what is no price', () => {
  expect(() => pricePerFt2('-1', 'm2')).toThrow(expect.objectContaining({ field: 'price' }));
});
