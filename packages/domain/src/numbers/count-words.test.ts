import { expect, it } from 'vitest';
import { countWords, figureWords } from './count-words.ts';

it.each([
  [0, '0'],
  [999, '999'],
  [1000, '1,000'],
  ['39400', '39,400'],
  [1234567, '1,234,567'],
])('says %s as %s', (count, words) => expect(countWords(count)).toBe(words));

it.each([
  ['999.75', '999.75'],
  ['1250', '1,250'],
  ['1250000.1250', '1,250,000.1250'],
])('says %s with its decimals as %s', (figure, words) => expect(figureWords(figure)).toBe(words));
