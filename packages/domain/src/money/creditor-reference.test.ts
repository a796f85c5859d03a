import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { creditorReference } from './creditor-reference.ts';

const alphabet = [...'0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ'];
const aBody = fc
  .array(fc.constantFrom(...alphabet), { minLength: 1, maxLength: 21 })
  .map((letters) => letters.join(''))
  .filter((text) => !text.startsWith('RF'));

const isDigit = (character: string): boolean => /^\d$/.test(character);

describe('creditorReference', () => {
  it('makes references that it finds right, in any writing', () => {
    fc.assert(
      fc.property(aBody, (body) => {
        const { valid, reference } = creditorReference(body);
        expect([valid, reference?.slice(4)]).toEqual([false, body]);
        const inFours = reference?.replace(/(.{4})/g, '$1 ').toLowerCase() ?? '';
        expect(creditorReference(inFours)).toEqual({ valid: true, reference });
      }),
    );
  });

  // A letter counts as two digits, so that only one for another of its kind is sure to be found.
  it('finds any one wrong digit among digits and letter among letters', () => {
    fc.assert(
      fc.property(aBody, fc.nat(), fc.constantFrom(...alphabet), (body, seed, wrong) => {
        const reference = creditorReference(body).reference ?? '';
        const at = 2 + (seed % (reference.length - 2));
        fc.pre(reference[at] !== wrong && isDigit(reference[at] ?? '') === isDigit(wrong));
        const text = `${reference.slice(0, at)}${wrong}${reference.slice(at + 1)}`;
        expect(creditorReference(text)).toEqual({ valid: false, reference: null });
      }),
    );
  });

  it('takes the number of a paper', () => {
    expect(creditorReference('I-0012')).toEqual(creditorReference('i 0012'));
  });

  it.each(['RF', 'RF18', 'RF18-539007547034', '1234567890123456789012', 'ä', '--'])(
    'makes nothing of %s',
    (text) => {
      expect(creditorReference(text)).toEqual({ valid: false, reference: null });
    },
  );
});
