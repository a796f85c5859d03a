import { expect, it } from 'vitest';
import { heldWords } from './held-words.ts';

it.each([
  [{ held: 90, onHand: 120, missing: 0 }, '90 held'],
  [{ held: 90, onHand: 20, missing: 70 }, '90 held, only 20 there'],
  [{ held: 90, onHand: 0, missing: 90 }, '90 held, none there'],
  [{ held: 90, onHand: 100, missing: 40 }, '90 held, only 100 there for all jobs'],
])('says of what is held how much is there', (item, words) => {
  expect(heldWords(item, String)).toBe(words);
});
