import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { offcutAreaMm2, type OffcutSize } from './offcut-area.ts';

const area = (size: Partial<OffcutSize>) =>
  offcutAreaMm2({ widthMm: null, heightMm: null, areaMm2: null, ...size });

function refusedAt(size: Partial<OffcutSize>): string {
  try {
    area(size);
  } catch (error) {
    if (error instanceof InvalidInput) return error.field;
  }
  return 'taken';
}

describe('the area of an offcut', () => {
  it('is its width times its height, to a thousandth', () => {
    expect(area({ widthMm: '304.8', heightMm: '304.8' })).toBe('92903.04');
    expect(area({ widthMm: '10.001', heightMm: '10.001' })).toBe('100.02');
  });

  it('is what was typed where it is no rectangle, with its size or without', () => {
    expect(area({ areaMm2: '92903.04' })).toBe('92903.04');
    expect(area({ widthMm: '300', heightMm: '200', areaMm2: '45000' })).toBe('45000');
    expect(area({ widthMm: '300', heightMm: '200', areaMm2: '60000' })).toBe('60000');
  });

  it('is refused beside the field that is wrong', () => {
    expect(refusedAt({})).toBe('widthMm');
    expect(refusedAt({ heightMm: '200' })).toBe('widthMm');
    expect(refusedAt({ widthMm: '200' })).toBe('heightMm');
    expect(refusedAt({ widthMm: '0', heightMm: '200' })).toBe('widthMm');
    expect(refusedAt({ areaMm2: '0' })).toBe('areaMm2');
    expect(refusedAt({ widthMm: '300', heightMm: '200', areaMm2: '60000.001' })).toBe('areaMm2');
  });

  it('is never more than its width times its height, whichever way it is turned', () => {
    const length = fc
      .integer({ min: 1, max: 5_000_000 })
      .map((n) => new Exact(n).div(1000).toFixed());
    fc.assert(
      fc.property(length, length, (widthMm, heightMm) => {
        const one = area({ widthMm, heightMm });
        expect(one).toBe(area({ widthMm: heightMm, heightMm: widthMm }));
        const box = new Exact(widthMm).times(heightMm);
        expect(box.minus(one).abs().lte('0.0005')).toBe(true);
      }),
    );
  });
});
