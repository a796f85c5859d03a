import { expect, it } from 'vitest';
import { proposedText, readQuantity } from './typed-quantity.ts';

const workshop = { areaUnit: 'ft2' } as never;
const rivets = { of: 'hardware', unit: 'piece', quantity: '400', usual: '400' } as const;
const side = { of: 'leather', unit: 'mm2', quantity: '0', usual: '2053157.184' } as const;

it('proposes what is to be ordered, or what one order would be', () => {
  expect(proposedText(rivets, workshop)).toBe('400');
  expect(proposedText(side, workshop)).toBe('22.1');
});

it('sends what nobody touched exactly', () => {
  expect(readQuantity('22.1', side, workshop)).toBe('2053157.184');
  expect(readQuantity('24³', side, workshop)).toBe('2299350.24');
});

it.each(['', '0', '-4', '1.5', '12,5', 'ten'])('takes %j for no quantity', (text) => {
  expect(readQuantity(text, rivets, workshop)).toBeUndefined();
});

it('reads thousands as people write them', () => {
  expect(readQuantity('1,250', rivets, workshop)).toBe('1250');
});
