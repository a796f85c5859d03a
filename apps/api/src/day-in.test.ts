import { expect, it } from 'vitest';
import { dayIn, dayOver } from './day-in.ts';

// Offsets of the zones in the IANA time zone database; New York puts its clocks forward on 8 March 2026.
it.each([
  ['UTC', '2026-12-01', '2026-12-02T00:00:00.000Z'],
  ['Pacific/Kiritimati', '2026-12-01', '2026-12-01T10:00:00.000Z'],
  ['America/New_York', '2026-03-07', '2026-03-08T05:00:00.000Z'],
  ['America/New_York', '2026-03-08', '2026-03-09T04:00:00.000Z'],
])('a day in %s is over at the first instant of the next', (timeZone, day, over) => {
  const end = new Date(dayOver(timeZone, day).over);
  expect(end.toISOString()).toBe(over);
  expect(dayIn(timeZone, end) > day).toBe(true);
  expect(dayIn(timeZone, new Date(end.getTime() - 1))).toBe(day);
});
