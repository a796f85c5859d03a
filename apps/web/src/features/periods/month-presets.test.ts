import { describe, expect, it } from 'vitest';
import { monthPresets } from './month-presets.ts';

describe('the periods on offer', () => {
  it('end today, or with the last day of a month', () => {
    expect(monthPresets('2028-03-14')).toEqual([
      { word: 'March 2028, so far', from: '2028-03-01', to: '2028-03-14' },
      { word: 'February 2028', from: '2028-02-01', to: '2028-02-29' },
      { word: 'January 2028', from: '2028-01-01', to: '2028-01-31' },
      { word: 'December 2027', from: '2027-12-01', to: '2027-12-31' },
      { word: '2028, so far', from: '2028-01-01', to: '2028-03-14' },
    ]);
  });
});
