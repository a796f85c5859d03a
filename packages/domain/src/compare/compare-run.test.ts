import { describe, expect, it } from 'vitest';
import { compareRun } from './compare-run.ts';

const estimate = {
  cut: 112,
  good: 100,
  minutes: '168',
  leatherAreaMm2: '600000',
  rejectPercent: '10',
};
const fact = {
  cut: 112,
  good: 104,
  rejects: 5,
  seconds: 3,
  minutes: '196',
  leatherAreaMm2: '660000',
};

describe('estimate and fact', () => {
  it('stand side by side, with how far the fact lies above', () => {
    expect(compareRun({ estimate, fact })).toEqual([
      { name: 'minutes per 100', said: '150', was: '175', unit: 'minutes', overPercent: '16.7' },
      { name: 'minutes', said: '168', was: '196', unit: 'minutes', overPercent: '16.7' },
      { name: 'cut', said: '112', was: '112', unit: 'pieces', overPercent: '0' },
      { name: 'good', said: '100', was: '104', unit: 'pieces', overPercent: '4' },
      { name: 'rejects', said: '10', was: '4.46', unit: 'percent', overPercent: '-55.4' },
      { name: 'leather', said: '600000', was: '660000', unit: 'mm2', overPercent: '10' },
    ]);
  });

  it('divides by nothing where nothing was said or cut', () => {
    const nothing = { ...fact, cut: 0, good: 0, rejects: 0, seconds: 0 };
    const rows = compareRun({ estimate: { ...estimate, rejectPercent: '0' }, fact: nothing });
    expect(rows.find(({ name }) => name === 'rejects')).toMatchObject({
      was: '0',
      overPercent: null,
    });
  });

  it('refuses more pieces counted than cut', () => {
    expect(() => compareRun({ estimate, fact: { ...fact, good: 110 } })).toThrow(
      'correct the counts',
    );
  });
});
