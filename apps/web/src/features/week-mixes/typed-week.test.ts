import type { WeekStart, WeekTyped } from '@hidewright/contract';
import { beforeEach, expect, it, vi } from 'vitest';
import { blankKind, forgetWeek, keepWeek, keptWeek, weekToType } from './typed-week.ts';

const week: WeekTyped = {
  hoursPerWeek: '60',
  deskHoursPerWeek: '6',
  incomeNeeded: '900.00',
  kinds: [{ ...blankKind('run', '30'), name: 'Coasters', benchMinutes: '240', left: '310.00' }],
};
const start = { week, from: { runs: 3, weeks: 9 }, wagePerHour: '20.00' } as WeekStart;

beforeEach(() => {
  const store = new Map<string, string>();
  const gone = (key: string) => void store.delete(key);
  vi.stubGlobal('localStorage', {
    getItem: (key: string) => store.get(key) ?? null,
    setItem: (key: string, value: string) => void store.set(key, value),
    removeItem: gone,
  });
  vi.stubGlobal('sessionStorage', { removeItem: gone });
});

it('begins with what this person worked out last, and nobody else’s', () => {
  const typed = { ...week, hoursPerWeek: '48' };
  keepWeek('ines@example.com', typed);
  expect(weekToType(start, 'ines@example.com')).toEqual(typed);
  expect(weekToType(start, 'maud@example.com')).toEqual(week);
  forgetWeek('ines@example.com');
  expect(weekToType(start, 'ines@example.com')).toEqual(week);
});

it('begins with the shop’s own runs where what was kept is of no use', () => {
  keepWeek('ines@example.com', { hoursPerWeek: '48' } as WeekTyped);
  expect(keptWeek('ines@example.com')).toBeUndefined();
  expect(weekToType(start, 'ines@example.com')).toEqual(week);
  const none = { ...start, week: { ...week, kinds: [] } };
  expect(weekToType(none, 'ines@example.com').kinds).toEqual([blankKind('run')]);
});
