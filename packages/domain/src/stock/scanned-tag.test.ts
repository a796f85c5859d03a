import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { binTag, hardwareOfBin, scannedTag, tagAddress } from './scanned-tag.ts';

describe('a tag that was scanned', () => {
  it.each([
    ['T-0012', 'T-0012'],
    [' T-0012\r\n', 'T-0012'],
    ['https://shop.example.com/t/T-0012', 'T-0012'],
    ['https://shop.example.com/t/HIDE%207/?from=tag', 'HIDE 7'],
    ['http://localhost:4370/t/B-0003#x', 'B-0003'],
    // a hand scanner whose capitals are locked
    ['HTTPS://SHOP.EXAMPLE.COM/T/T-0032', 'T-0032'],
    ['100%', '100%'],
  ])('is read from %j', (text, tag) => {
    expect(scannedTag(text)).toBe(tag);
  });

  it.each(['', '   ', '\u0000\r', 'x'.repeat(61)])('is none in %j', (text) => {
    expect(scannedTag(text)).toBeUndefined();
  });

  it('comes back from the address that is printed on it', () => {
    const printable = fc
      .string({ minLength: 1, maxLength: 30 })
      .filter((tag) => tag.trim() === tag && /^[^\p{Cc}\p{Cs}]+$/u.test(tag) && tag !== '.');
    fc.assert(
      fc.property(printable, (tag) => {
        expect(scannedTag(tagAddress('https://shop.example.com/', tag))).toBe(tag);
      }),
    );
  });

  it('names a bin by its hardware, and no other thing', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 999_999_999 }), (id) => {
        expect(hardwareOfBin(binTag(id))).toBe(id);
      }),
    );
    expect(binTag(12)).toBe('B-0012');
    for (const tag of ['B-0', 'B-', 'B-12x', 'T-0012', 'B-9999999999'])
      expect(hardwareOfBin(tag)).toBeUndefined();
  });
});
