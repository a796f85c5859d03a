import type { RunBasis } from '@hidewright/contract';
import type { RunInput } from '@hidewright/domain';
import { priceRun } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';
import { previewOf, type TypedSoFar } from './price-preview.ts';

const input: RunInput = {
  breaks: [{ quantity: 100, typedPrice: null }],
  confidencePercent: '95',
  layout: { form: 'panel', pieces: 21, containerAreaMm2: '92257.88' },
  leather: { name: 'Oak tan', pricePerFt2: '9.50' },
  hardware: [{ name: 'Rivet', unitPrice: '0.17', perPiece: 2 }],
  tooling: [],
  work: { kind: 'minutesPer100', minutes: '150', rejectPercent: '10' },
  wagePerHour: '22',
  deskMinutesPerOrder: '45',
  packingPerOrder: '6',
  targetPerHour: '60',
  priceStep: '0.05',
  minorDigits: 2,
};
const basis = { input } as RunBasis;

const numbersOf = (typed: TypedSoFar) => {
  const preview = previewOf(basis, typed);
  if ('why' in preview) throw new Error(preview.why);
  return preview.numbers;
};

describe('the preview of a quote', () => {
  it('is what the domain makes of the same input', () => {
    const typed = {
      breaks: [
        { quantity: 50, typedPrice: '4.20' },
        { quantity: 250, typedPrice: null },
      ],
      tooling: [{ name: 'Stamp plate', cost: '48.00', charge: '60' }],
    };
    expect(numbersOf(typed)).toEqual(
      priceRun({
        ...input,
        breaks: typed.breaks,
        tooling: [{ name: 'Stamp plate', cost: '48.00', charge: '60' }],
      }),
    );
  });

  it('leaves out what is only half typed', () => {
    const numbers = numbersOf({
      breaks: [
        { quantity: 50, typedPrice: '4.' },
        { quantity: '' },
        { quantity: -1 },
        { quantity: 1.5 },
        { quantity: 50 },
      ],
      tooling: [{ name: '', cost: 'x', charge: undefined }],
    });
    expect(numbers.breaks.map(({ quantity, typed }) => [quantity, typed])).toEqual([[50, false]]);
  });

  it('takes what is set by hand', () => {
    const plain = numbersOf({ breaks: [{ quantity: 100 }] }).breaks[0]!;
    const byHand = numbersOf({
      breaks: [{ quantity: 100 }],
      overrides: { rejectPercent: '30', leatherPricePerFt2: '19' },
    }).breaks[0]!;
    expect(byHand.cutCount).toBeGreaterThan(plain.cutCount);
    expect(Number(byHand.suggestedPrice)).toBeGreaterThan(Number(plain.suggestedPrice));
  });

  it('says why there are no numbers', () => {
    expect(previewOf(basis, { breaks: [] })).toEqual({
      why: 'Enter a quantity, and its price is worked out here.',
    });
    const preview = previewOf(basis, {
      breaks: [{ quantity: 10 }],
      overrides: { rejectPercent: '100' },
    });
    expect(preview).toMatchObject({ why: expect.stringContaining('nothing to sell') });
  });
});
