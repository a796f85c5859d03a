import { expect, it } from 'vitest';
import { arrivalDay, leadTime } from './lead-time.ts';

it('is what the supplier says until three deliveries say otherwise', () => {
  expect(leadTime(10, [4, 20])).toEqual({ meanDays: 10, sdDays: 0, deliveries: 0 });
  expect(leadTime(10, [8, 12, 16])).toEqual({ meanDays: 12, sdDays: 4, deliveries: 3 });
});

it('refuses days below 0', () => {
  expect(() => leadTime(-1, [])).toThrow('said');
  expect(() => leadTime(1, [-1])).toThrow('took.0');
});

it('ends on a working day', () => {
  expect(arrivalDay('2026-12-01', { meanDays: 3.4 })).toBe('2026-12-04');
  expect(arrivalDay('2026-12-01', { meanDays: 3.6 })).toBe('2026-12-07');
  expect(arrivalDay('2026-12-01', { meanDays: 0 })).toBe('2026-12-01');
});
