import { describe, expect, it } from 'vitest';
import { DomainError } from '../errors/domain-error.ts';
import { compute, computeNames } from './compute.ts';

type Json = null | boolean | number | string | Json[] | { [field: string]: Json };
type Fields = { [field: string]: Json };

const breaks = [
  { from: 1, price: '5.00' },
  { from: 100, price: '4.50' },
];

/** One sound question for every name but layout, which has tests of its own. */
const sound: Record<string, Fields> = {
  'cut-count': { good: 10, history: { good: 47, total: 50 }, confidence: 0.95 },
  interval: { good: 9, total: 10, confidence: 0.95, method: 'wilson' },
  'rolled-yield': { rates: [0.9, 0.8], good: 10 },
  eoq: { demand: 900, orderCost: '20.00', holdingRate: 0.2, breaks },
  reorder: { demandMean: 30, demandSd: 5, leadMean: 10, leadSd: 1, service: 0.95 },
  croston: { series: [0, 3, 0, 4], alpha: 0.1 },
  smooth: { series: [5, 6], alpha: 0.1, first: 5 },
  'stock-cost': { movements: [{ in: 5, unitCost: '2.00' }, { out: 3 }], method: 'fifo' },
  available: { onHand: 5, receipts: [0, 10], orders: [1, 2] },
  'late-jobs': { jobs: [{ time: 3, due: 5 }] },
  'two-machine': { jobs: [[3, 5]] },
  'flow-time': { quantity: 10, times: [1, 2], transfer: 5 },
  learning: { model: 'unit', curve: 0.8, n: 10 },
  'present-value': { rate: 0.1, flows: ['-100.00', '60.00'] },
  payback: { flows: ['-100.00', '60.00', '60.00'] },
  'plate-choice': {
    impressions: 900,
    plates: [{ metal: 'brass', price: '90.00', life: 9000, used: 10 }],
  },
  'price-breaks': { breaks },
  allocate: { amount: '10.00', weights: [1, 2] },
  round: { value: '1.005', places: 2, mode: 'halfUp' },
  'creditor-reference': { text: 'RF18539007547034' },
  convert: { value: 8, from: 'oz', to: 'mm' },
};

const names = Object.keys(sound);

/** Every value inside, each replaced by `wrong`, one at a time. */
function spoiled(value: Json, wrong: Json): Json[] {
  const inside = Array.isArray(value)
    ? value.flatMap((each, at) => spoiled(each, wrong).map((bad) => value.with(at, bad)))
    : typeof value === 'object' && value !== null
      ? Object.entries(value).flatMap(([field, each]) =>
          spoiled(each, wrong).map((bad) => ({ ...value, [field]: bad })),
        )
      : [];
  return [wrong, ...inside];
}

function attempt(name: string, input: Json): unknown {
  try {
    return compute(name, input);
  } catch (error) {
    return error;
  }
}

const sentence = expect.objectContaining({
  message: expect.stringMatching(/^[A-Z“][^\n]+\.$/) as unknown,
});

describe('compute', () => {
  it('is asked here about every name', () => {
    expect([...names, 'layout'].sort()).toEqual([...computeNames].sort());
  });

  it.each(names)('%s answers what is sound', (name) => {
    expect(attempt(name, sound[name] ?? {})).not.toBeInstanceOf(Error);
  });

  it.each(names)('%s refuses a field that is missing, and one that nobody knows', (name) => {
    const fields = sound[name] ?? {};
    for (const field of Object.keys(fields)) {
      const { [field]: _missing, ...rest } = fields;
      expect(attempt(name, rest)).toBeInstanceOf(DomainError);
    }
    expect(attempt(name, { ...fields, more: 1 })).toEqual(sentence);
  });

  it.each(names)('%s refuses values of the wrong kind', (name) => {
    for (const wrong of [null, true, 'NaN', '', [], {}, [[]], '1e5', ' 1'] as Json[]) {
      for (const input of spoiled(sound[name] ?? {}, wrong)) {
        const isText =
          name === 'creditor-reference' || /"(metal|text)":/.test(JSON.stringify(input));
        if (isText && typeof wrong === 'string') continue;
        const error = attempt(name, input);
        expect([input, error]).toEqual([input, expect.any(DomainError)]);
        expect(error).toEqual(sentence);
      }
    }
  });

  it.each(names)('%s never answers with a number that is none', (name) => {
    for (const wrong of [-1, -0.5, 0, 0.5, 1e-300, 1e300, Infinity, NaN, 2 ** 53]) {
      for (const input of spoiled(sound[name] ?? {}, wrong)) {
        const answer = attempt(name, input);
        if (answer instanceof DomainError) continue;
        expect([input, answer]).not.toEqual([input, expect.any(Error)]);
        // Nothing is received in a period, or the money never comes back.
        if (['available', 'payback'].includes(name)) continue;
        expect(JSON.stringify(answer)).not.toContain('null');
      }
    }
  });

  it.each(names)('%s refuses numbers below zero', (name) => {
    // Money may be taken out, and an amount to round or to share may be a credit.
    if (['present-value', 'payback', 'allocate', 'round'].includes(name)) return;
    for (const input of spoiled(sound[name] ?? {}, -1)) {
      expect([input, attempt(name, input)]).toEqual([input, expect.any(DomainError)]);
    }
  });
});
