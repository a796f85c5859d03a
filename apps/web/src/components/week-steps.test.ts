import { expect, it } from 'vitest';
import { heldOf, spokenWeeks, weekSteps } from './week-steps.ts';

it('begins with what is free today, and never below nothing', () => {
  const day = { day: '2026-12-09', comes: '0', goes: '80', left: '-20', what: [] };
  expect(weekSteps({ onHand: '100', reserved: '40', days: [day] }, '2026-12-01')).toEqual([
    { after: 0, left: 60, comes: 0 },
    { after: 8, left: -20, comes: 0 },
  ]);
  expect(weekSteps({ onHand: '10', reserved: '40', days: [] }, '2026-12-01')[0]?.left).toBe(0);
});

it('says what there is, held, to come, and when it does not suffice', () => {
  const item = {
    ...{ name: 'Rivet', onHand: '100', reserved: '140', runsOutOn: '2026-12-20' },
    days: [
      { day: '2026-12-09', comes: '80', left: '80' },
      { day: '2026-12-20', comes: '0', left: '-5' },
    ],
  };
  expect(heldOf(item)).toBe(100);
  expect(spokenWeeks(item, { say: String, dayText: (day) => day })).toBe(
    'Rivet: 100 there, 100 of it held for jobs, 0 free today, 80 comes 2026-12-09, too little from 2026-12-20',
  );
});
