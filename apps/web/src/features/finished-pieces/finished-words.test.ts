import { expect, it } from 'vitest';
import { finishedName, shelfWords } from './finished-words.ts';

const piece = (onHand: number, change: object = {}) => ({
  sort: 'good' as const,
  option: null,
  place: '',
  customerId: null,
  onHand,
  ...change,
});

it('names a kind of finished piece with its option and sort', () => {
  const named = { patternName: 'Round coaster', option: 'in brass', sort: 'seconds' as const };
  expect(finishedName(named)).toBe('Round coaster, in brass, seconds');
});

it('says what a customer could have from the shelf, and nobody else’s mark', () => {
  const shelf = [
    piece(20),
    piece(4, { option: 'in brass' }),
    piece(3, { sort: 'seconds' }),
    piece(9, { customerId: 7 }),
  ];
  expect(shelfWords(shelf, undefined)).toBe(
    '24 finished ones, 4 of them in brass and 3 finished seconds are on the shelf.',
  );
  expect(shelfWords(shelf, 7)).toMatch(/^33 finished ones/);
  expect(shelfWords([piece(1)], undefined)).toBe('1 finished one is on the shelf.');
  expect(shelfWords([piece(0), piece(2, { customerId: 7 })], 8)).toBeUndefined();
});
