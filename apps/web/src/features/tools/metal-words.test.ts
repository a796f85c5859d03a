import { expect, it } from 'vitest';
import { changesText, choiceText, turnText } from './metal-words.ts';

const one = { metal: 'magnesium', cost: '46.00', plates: 1 };
const metals = {
  ...{ left: 0, impressions: 500, impressionsInAll: 12_500 },
  ...{ rows: [], turns: [], leastNow: one, leastInAll: { ...one, cost: '92.00', plates: 2 } },
};

it('says which metal costs least for the run and over its repeats', () => {
  expect(choiceText(metals, 0, 'EUR')).toBe(
    'For this run magnesium, one new plate for 46.00 EUR, costs least.',
  );
  expect(choiceText(metals, 3, 'EUR')).toBe(
    'For this run magnesium, one new plate for 46.00 EUR, costs least. Over all 12,500 impressions magnesium, 2 new plates for 92.00 EUR, costs least.',
  );
  expect(choiceText({ ...metals, leastNow: null }, 0, 'EUR')).toContain('none need be bought');
  expect(choiceText({ ...metals, leastNow: null, leastInAll: null }, 2, 'EUR')).toContain(
    'repeats',
  );
});

it('says from which quantity the dearer metal pays', () => {
  const turn = { cheap: 'magnesium', dear: 'brass', from: 70_001 };
  expect(turnText(turn, 0)).toMatch(/^Brass pays from 70,001 impressions on: before that/);
  expect(turnText(turn, 300)).toContain('those of the plate that is there included');
  expect(turnText({ ...turn, from: null }, 0)).toContain('never costs less');
});

it('says how often a plate is changed in the run', () => {
  const bought = { plates: 1, cost: '46.00' };
  expect(changesText({ ...bought, changes: 0, firstChangeAfter: null })).toBe('never');
  expect(changesText({ ...bought, changes: 1, firstChangeAfter: 300 })).toBe('once, after 300');
  expect(changesText({ ...bought, changes: 2, firstChangeAfter: 10_000 })).toBe(
    '2 times, first after 10,000',
  );
});
