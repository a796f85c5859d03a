import { expect, it } from 'vitest';
import { weekSteps } from './week-steps.ts';

it('begins with what is free today, and never below nothing', () => {
  const day = { day: '2026-12-09', comes: '0', goes: '80', left: '-20', what: [] };
  expect(weekSteps({ onHand: '100', reserved: '40', days: [day] }, '2026-12-01')).toEqual([
    { after: 0, left: 60 },
    { after: 8, left: -20 },
  ]);
  expect(weekSteps({ onHand: '10', reserved: '40', days: [] }, '2026-12-01')[0]?.left).toBe(0);
});
