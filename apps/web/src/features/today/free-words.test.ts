import { expect, it } from 'vitest';
import { freeWords } from './free-words.ts';

it.each([
  [{ free: 70, reorderAt: 100 }, '70 free, keep 100'],
  [{ free: 0, reorderAt: 1500 }, 'None free, keep 1,500'],
  [{ free: -70, reorderAt: 300 }, 'None free, 70 too few, keep 300'],
])('says what is free without a minus', (item, words) => {
  const { figure, rest } = freeWords(item);
  expect(`${figure} ${rest}`).toBe(words);
});
