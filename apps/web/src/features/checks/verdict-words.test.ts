import type { CheckAnswer } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { inTimeWords, mendedWords, shortWords } from './verdict-words.ts';

const answer = (about: CheckAnswer['about'], enough: boolean): CheckAnswer => ({
  about,
  enough,
  name: '',
  hardwareId: null,
  unit: 'piece',
  needed: '1',
  freeNow: '1',
  free: '1',
  short: '0',
  enoughOn: null,
  toBuy: false,
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
      'if the tooling is here',
    );
    expect(mendedWords({ ...run, earliestDay: '2026-12-02' }, '2026-12-01')).toBe(
      'It can still be packed in time, if what is short is ordered today.',
    );
    const busy = { ...run, answers: [answer('hours', false)] };
    expect(mendedWords(busy, '2026-12-01')).toBe(
      'It can be packed by Wed 9 Dec, if nothing else comes first.',
    );
    expect(mendedWords({ ...run, earliestDay: null }, '2026-12-01')).toBe(
      'Nobody can tell yet by when it could be packed.',
    );
  });

  it('says whether a yes counts on what is yet to come', () => {
    const run = {
      ...{ quantity: 1, cutCount: 1, containers: 1, yes: true, lots: [], notes: [] },
      ...{ patternId: 1, remarks: [] },
      ...{ by: '2026-12-10', startBy: '2026-12-09', earliestDay: '2026-12-09' },
    };
    const said = (freeNow: string) =>
      inTimeWords({ ...run, answers: [{ ...answer('hardware', true), freeNow }] }, '2026-12-01');
    expect(said('1')).toBe('In time: everything is there.');
    expect(said('0')).toBe('In time, if what is on order is here by Wed 9 Dec.');
  });
});
