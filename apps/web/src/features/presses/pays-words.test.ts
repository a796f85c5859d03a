import { describe, expect, it } from 'vitest';
import { hoursAndMinutes, monthsText, paysWords } from './pays-words.ts';
import { answerFor, type TypedMachine } from './typed-machine.ts';

const press: TypedMachine = {
  price: '600',
  minutesSavedPerRun: '50',
  runsPerMonth: '5',
  hourWorth: '24',
  upkeepPerYear: '60',
  years: '5',
  interestPercent: '6',
};

const wordsFor = (typed: TypedMachine): string[] => {
  const answer = answerFor(typed);
  return 'pays' in answer ? paysWords(typed, answer.pays) : [answer.why];
};

describe('whether a machine pays, in words', () => {
  it('says what it saves, when its price is back and from how many runs it pays', () => {
    expect(wordsFor(press)).toEqual([
      'It saves 4 h 10 min a month, worth 100.00 at 24.00 an hour; its upkeep takes 5.00 of it.',
      'Its price is back after 7 months.',
      'Over 5 years it is worth 4,202.09 today, its price taken off and 6\u202f% a year reckoned for the money.',
      'It pays from 0.9 runs a month; you have 5.',
    ]);
  });

  it('says that it never pays', () => {
    const idle = wordsFor({ ...press, minutesSavedPerRun: '0', years: '1' });
    expect(idle[1]).toBe('Its price does not come back within 1 year.');
    expect(idle[3]).toContain('no number of runs');
  });

  it('names what is still to be typed', () => {
    expect(answerFor({ ...press, price: '' })).toMatchObject({ field: 'price' });
    expect(answerFor({ ...press, years: '' })).toMatchObject({ field: 'years' });
    expect(answerFor({ ...press, years: '2.5' })).toMatchObject({ field: 'years' });
  });
});

it.each([
  ['59', '59 min'],
  ['60', '1 h'],
  ['250', '4 h 10 min'],
  ['0', '0 min'],
])('%s minutes are %s', (minutes, text) => expect(hoursAndMinutes(minutes)).toBe(text));

it.each([
  [0.2, '1 month'],
  [6.3, '7 months'],
  [12, '1 year'],
  [30, '2 years 6 months'],
])('%d months are %s', (months, text) => expect(monthsText(months)).toBe(text));
