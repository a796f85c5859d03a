import type { CheckAnswer } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { mendedWords, shortWords } from './verdict-words.ts';

const answer = (about: CheckAnswer['about'], enough: boolean): CheckAnswer => ({
  about,
  enough,
  name: '',
  unit: 'piece',
  needed: '1',
  freeNow: '1',
  free: '1',
  short: '0',
  enoughOn: null,
  sentence: '',
});

describe('the verdict in words', () => {
  it('names each kind of thing that is short once', () => {
    expect(shortWords([answer('leather', false), answer('hours', true)])).toBe('leather is short.');
    const three = [answer('hardware', false), answer('hardware', false), answer('hours', false)];
    expect(shortWords(three)).toBe('hardware and bench hours are short.');
    expect(shortWords([answer('hours', false)])).toBe('bench hours are short.');
  });

  it('says by when it can be had, and on what condition', () => {
    const run = {
      answers: [answer('hardware', false)],
      by: '2026-12-03',
      earliestDay: '2026-12-09',
    };
    expect(mendedWords(run, '2026-12-01')).toBe(
      'It can be packed by Wed 9 Dec, if what is short is ordered today.',
    );
    expect(mendedWords({ ...run, answers: [answer('tooling', false)] }, '2026-12-01')).toContain(
      'and the tooling is here',
    );
    expect(mendedWords({ ...run, earliestDay: null }, '2026-12-01')).toBe(
      'Nobody can tell yet by when it could be packed.',
    );
  });
});
