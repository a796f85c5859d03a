import { describe, expect, it } from 'vitest';
import { clockMinutes, draftInWords, emptyDraft, isMinutes, minutesToSend } from './step-draft.ts';

describe('what a press will log, in words', () => {
  it('names only what was counted', () => {
    expect(draftInWords({ ...emptyDraft, good: 13, rejects: 1, minutes: '12' })).toBe(
      '13 good, 1 reject, 12 min',
    );
    expect(draftInWords({ ...emptyDraft, rejects: 2, seconds: 1 })).toBe('2 rejects, 1 second');
    expect(draftInWords(emptyDraft)).toBe('');
  });

  it('shows what is taken back with a true minus', () => {
    expect(draftInWords({ ...emptyDraft, good: -2, minutes: '-4' })).toBe('−2 good, −4 min');
  });
});

describe('minutes', () => {
  it.each(['', '12', '7.5', '7,5', '-4', ' 3 '])('takes “%s”', (text) =>
    expect(isMinutes(text)).toBe(true),
  );
  it.each(['twelve', '1e3', 'NaN', '1.234', '123456', '--1', '1 2'])('refuses “%s”', (text) =>
    expect(isMinutes(text)).toBe(false),
  );
  it.each([
    ['', '0'],
    ['7,5', '7.5'],
    ['012', '12'],
    ['7.50', '7.5'],
    ['-0', '0'],
  ])('sends “%s” as %s', (typed, sent) => expect(minutesToSend(typed)).toBe(sent));

  it('come from the clock to a tenth, and never run backwards', () => {
    expect(clockMinutes(0, 7 * 60_000 + 32_000)).toBe(7.5);
    expect(clockMinutes(60_000, 0)).toBe(0);
  });
});
