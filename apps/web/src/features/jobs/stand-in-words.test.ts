import { expect, it } from 'vitest';
import { standsInText } from './stand-in-words.ts';

it('says what may be taken in whose place, and nothing of what is needed itself', () => {
  const rivet = { name: 'Rivet 9 mm', inKit: null };
  const snap = { name: 'Snap', inKit: 'Ring of caps' };
  expect(standsInText({ needed: 0, standsInFor: [rivet] })).toBe('can stand in for Rivet 9 mm');
  expect(standsInText({ needed: 0, standsInFor: [rivet, snap] })).toBe(
    'can stand in for Rivet 9 mm and Snap as part of Ring of caps',
  );
  expect(standsInText({ needed: 5, standsInFor: [rivet] })).toBe('');
  expect(standsInText({ needed: 0, standsInFor: [] })).toBe('');
});
