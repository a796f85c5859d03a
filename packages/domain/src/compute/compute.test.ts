import { describe, expect, it } from 'vitest';
import { compute, computeNames } from './compute.ts';

describe('compute', () => {
  it.each([
    ['cut-count', { good: 100, rate: 0.95, confidence: 0.95 }, { pieces: 109 }],
    ['cut-count', { good: 10, history: { good: 47, total: 50 }, confidence: 0.95 }, { pieces: 13 }],
    ['rolled-yield', { rates: [0.5, 0.5], good: 10 }, { yield: 0.25, start: 40 }],
    ['allocate', { amount: '100.00', weights: [1, 1, 1] }, { parts: ['33.34', '33.33', '33.33'] }],
    ['allocate', { amount: '1', weights: ['1', '2'] }, { parts: ['0.33', '0.67'] }],
    ['allocate', { amount: '0.100', weights: [1, 2] }, { parts: ['0.033', '0.067'] }],
    ['allocate', { amount: 10, weights: [1, 1, 1] }, { parts: [4, 3, 3] }],
    ['round', { value: '1.005', places: 2, mode: 'halfUp' }, { value: '1.01' }],
    ['round', { value: 1.005, places: 2, mode: 'halfEven' }, { value: 1 }],
    ['round', { value: 2.5, places: 0, mode: 'halfEven' }, { value: 2 }],
    ['convert', { value: 8, from: 'oz', to: 'mm' }, { value: 3.175 }],
    ['convert', { value: '1', from: 'ft2', to: 'dm2' }, { value: 9.290304 }],
    [
      'layout',
      {
        id: 'two bars',
        outline: [
          [0, 0],
          [40, 0],
          [40, 10],
          [0, 10],
        ],
        container: { type: 'rect', w: 40, h: 20 },
        gap: 0,
        rotations: [0],
      },
      { id: 'two bars', placements: [{ rot: 0 }, { rot: 0 }], utilisation: 1 },
    ],
  ])('%s answers %j', (name, input, answer) => {
    expect(compute(name, input)).toMatchObject(answer);
  });

  it.each([
    ['no-such', {}, `choose ${computeNames.join(', ')}`],
    ['toString', {}, 'There is no toString computation'],
    ['round', null, 'Give one JSON object'],
    ['round', [1], 'Give one JSON object'],
    ['round', { value: 1, places: 2, mode: 'up' }, 'halfUp or halfEven'],
    ['round', { value: 1, places: 2.5, mode: 'halfUp' }, 'whole number from 0 to 20'],
    ['round', { value: '1e5', places: 2, mode: 'halfUp' }, 'plain decimal text'],
    ['round', { places: 2, mode: 'halfUp' }, 'Give value.'],
    ['cut-count', { good: 10, confidence: 0.95 }, 'either rate or history'],
    [
      'cut-count',
      { good: 10, rate: 0.9, history: { good: 1, total: 2 }, confidence: 0.95 },
      'either rate or history',
    ],
    ['cut-count', { good: 10, rate: '0.9', confidence: 0.95 }, 'Give rate as a number'],
    ['cut-count', { good: 10, rate: 0.9, confidence: 0.95, sure: true }, 'Leave out sure'],
    ['allocate', { amount: '1.00', weights: [] }, 'at least one entry'],
    ['allocate', { amount: '1.00', weights: ['x'] }, 'weights.0'],
    ['layout', { outline: [[0, 0], [1]] }, 'Give outline.1 as [x, y]'],
    ['layout', { outline: [], container: { type: 'disc' } }, 'rect, strip or polygon'],
    ['convert', { value: 1, from: 'ft', to: 'mm' }, 'Give from as one of'],
    ['convert', { value: 1, from: 'ft2', to: 'mm' }, 'choose two units of the same kind'],
  ])('%s refuses %j', (name, input, sentence) => {
    expect(() => compute(name, input)).toThrow(sentence);
  });
});
