import type { WeekMixReply } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { hourWords, incomeWords, largeWords } from './mix-words.ts';

const mix: WeekMixReply = {
  kinds: [
    {
      name: 'Coasters',
      kind: 'run',
      units: '4',
      benchHours: '12',
      deskHours: '4',
      left: '960.00',
      leftPerHour: '60.00',
      at: 'most',
    },
  ],
  hours: { all: '40', deskFirst: '4', free: '0' },
  left: '1560.00',
  averagePerHour: '39.00',
  oneMoreHour: { left: '30.00', into: ['Weekend bag'] },
  income: { needed: '1500.00', reached: true, short: '0.00', hoursShort: null },
  largePieces: { hours: '20', atMost: '22' },
};
const short = { needed: '1800.00', reached: false, short: '240.00' };

describe('a week’s mix in words', () => {
  it('says whether the income is reached', () => {
    expect(incomeWords(mix)).toBe(
      'The week leaves 1,560.00, which is 60.00 over the 1,500.00 that the shop needs.',
    );
    expect(incomeWords({ ...mix, income: { ...short, hoursShort: '8' } })).toBe(
      'The week leaves 1,560.00: 240.00 short of the 1,800.00 that the shop needs. 8 h more a week would bring it; so would a better price.',
    );
    expect(incomeWords({ ...mix, income: { ...short, hoursShort: null } })).toContain(
      'More hours would not bring it',
    );
  });

  it('keeps one more hour and the average one apart', () => {
    expect(hourWords(mix, '22.00')).toBe(
      'One more bench hour would leave 30.00 more, its share of desk time counted; it would go into Weekend bag. That is not the average: an hour of this week leaves 39.00. Paid at your wage of 22.00, it still brings 8.00.',
    );
    expect(hourWords(mix, '35.00')).toContain('It does not earn your wage of 35.00.');
    const idle = {
      ...mix,
      hours: { ...mix.hours, free: '5' },
      oneMoreHour: { left: '0.00', into: [] },
    };
    expect(hourWords(idle, '22.00')).toBe(
      'One more bench hour would leave nothing more: everything that can be sold is made. 5 h are free already.',
    );
  });

  it('says which hours stay for large pieces', () => {
    expect(largeWords(mix)).toBe(
      'Up to 22 h of the week can go to large pieces, and the income needed is still reached.',
    );
    const poor = {
      ...mix,
      income: { ...short, hoursShort: null },
      largePieces: { hours: '0', atMost: null },
    };
    expect(largeWords(poor)).toContain('do not carry large pieces yet');
  });
});
