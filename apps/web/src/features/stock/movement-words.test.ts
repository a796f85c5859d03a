import { describe, expect, it } from 'vitest';
import { quantityText, signedText } from './movement-words.ts';

const feet = { areaUnit: 'ft2', areaShown: 'tenth' } as const;
const quarters = { ...feet, areaShown: 'quarter' } as const;

describe('a quantity of the ledger', () => {
  it('is an area of a lot, or a count of hardware, with its sign', () => {
    expect(signedText({ areaMm2: '2299350.24', quantity: null }, feet)).toBe('+24.8 ft²');
    expect(signedText({ areaMm2: '-139354.56', quantity: null }, quarters)).toBe('−1² ft²');
    expect(signedText({ areaMm2: null, quantity: -1200 }, feet)).toBe('−1,200');
    expect(quantityText({ areaMm2: null, quantity: 600 }, feet)).toBe('600');
  });
});
