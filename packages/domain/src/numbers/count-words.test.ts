import { expect, it } from 'vitest';
import { countWords } from './count-words.ts';

it.each([
  [0, '0'],
  [999, '999'],
  [1000, '1,000'],
  ['39400', '39,400'],
  [1234567, '1,234,567'],
])('says %s as %s', (count, words) => expect(countWords(count)).toBe(words));
