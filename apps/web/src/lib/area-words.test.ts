import { describe, expect, it } from 'vitest';
import { areaPriceText, rackAreaText } from './formatting.ts';

const ft2 = (feet: number) => (feet * 92903.04).toFixed(3);

describe('an area on the rack', () => {
  it.each([
    [24.75, 'tenth', '24.8 ft²'],
    [24.75, 'quarter', '24³ ft²'],
    [24.9, 'quarter', '25 ft²'],
    [1024.5, 'quarter', '1,024² ft²'],
    [0.05, 'quarter', '0.05 ft²'],
    [0, 'tenth', '0 ft²'],
  ] as const)('of %s ft² in a %s reads “%s”', (feet, areaShown, text) => {
    expect(rackAreaText(ft2(feet), { areaUnit: 'ft2', areaShown })).toBe(text);
  });

  it('knows no quarters in dm²', () => {
    expect(rackAreaText('123456', { areaUnit: 'dm2', areaShown: 'quarter' })).toBe('12.35 dm²');
  });
});

it('the price of leather is said for the shop’s own area', () => {
  expect(areaPriceText('9.5', 'ft2')).toBe('9.50');
  expect(areaPriceText('9.5', 'dm2')).toBe('1.0226');
  expect(areaPriceText('9.4761', 'm2')).toBe('102.00');
});
