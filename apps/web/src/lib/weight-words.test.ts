import { describe, expect, it } from 'vitest';
import { weightText } from './weight-words.ts';

describe('the weight of a leather', () => {
  it.each([
    ['5', '6', '5–6 oz (2.0–2.4 mm)'],
    ['5.500', null, '5.5 oz (2.2 mm)'],
    ['8', '8', '8 oz (3.2 mm)'],
    [null, null, ''],
  ])('%s to %s reads “%s”', (weightLowOz, weightHighOz, text) => {
    expect(weightText({ weightLowOz, weightHighOz })).toBe(text);
  });
});
