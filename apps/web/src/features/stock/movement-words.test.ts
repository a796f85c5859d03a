import { describe, expect, it } from 'vitest';
import { quantityText, signedText } from './movement-words.ts';

describe('a quantity of the ledger', () => {
  it('is an area of a lot, or a count of hardware, with its sign', () => {
    expect(signedText({ areaMm2: '2299350.24', quantity: null }, 'ft2')).toBe('+24.75 ft²');
    expect(signedText({ areaMm2: '-92903.04', quantity: null }, 'ft2')).toBe('−1 ft²');
    expect(signedText({ areaMm2: null, quantity: -1200 }, 'ft2')).toBe('−1,200');
    expect(quantityText({ areaMm2: null, quantity: 600 }, 'ft2')).toBe('600');
  });
});
