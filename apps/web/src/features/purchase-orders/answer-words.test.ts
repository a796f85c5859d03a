import { describe, expect, it } from 'vitest';
import { answerWords, differenceWords } from './answer-words.ts';

const workshop = { currency: 'USD', timeZone: 'Europe/London', today: '2026-12-10' };

describe('what differs in a delivery', () => {
  it('is more or less than ordered', () => {
    expect(differenceWords('1007.50', workshop)).toBe('USD 1,007.50 more than ordered');
    expect(differenceWords('-0.40', workshop)).toBe('USD 0.40 less than ordered');
  });

  it('is said with why, by whom and when it was answered', () => {
    const answer = { reason: 'Brass went up.', by: 'Ines', at: '2026-12-01T09:00:00.000Z' };
    expect(answerWords('T-0004', answer, workshop)).toBe(
      'T-0004: Brass went up. (Ines, Tue 1 Dec, 09:00)',
    );
    const lastYear = { ...answer, reason: '', at: '2025-07-01T09:00:00.000Z' };
    expect(answerWords('T-0004', lastYear, workshop)).toBe('T-0004 (Ines, Tue 1 Jul 2025, 10:00)');
  });
});
