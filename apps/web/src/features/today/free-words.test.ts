import { expect, it } from 'vitest';
import { freeWords } from './free-words.ts';

it.each([
  [{ free: 70, reorderAt: 100 }, '70 free, keep\u00a0100'],
  [{ free: 0, reorderAt: 1500 }, 'None free, keep\u00a01,500'],
  [{ free: -70, reorderAt: 300 }, 'None free, 70 too few, keep\u00a0300'],
])('says what is free without a minus', (item, words) => {
  const { figure, rest } = freeWords(item);
  expect(`${figure} ${rest}`).toBe(words);
});
