import { InvalidInput } from '../errors/domain-error.ts';
import { allocate } from '../money/allocate.ts';
import { creditorReference } from '../money/creditor-reference.ts';
import { round } from '../money/round.ts';
import { Exact, toPlaces } from '../numbers/decimal-text.ts';
import { convert, isUnit, type Unit, units } from '../units/convert.ts';
import type { Answers } from './answers.ts';
import { asDecimal, InputReader } from './read-input.ts';

export const bookAnswers: Answers = {
  allocate: answerAllocate,

  round(input) {
    const read = new InputReader(input, ['value', 'places', 'mode']);
    const mode = read.choice('mode', ['halfUp', 'halfEven']);
    const places = read.number('places');
    const rounded = toPlaces(round(new Exact(read.decimal('value')), places, mode), places);
    // An amount of money comes and goes as text; a number is answered by a number.
    return { value: typeof read.any('value') === 'number' ? Number(rounded) : rounded };
  },

  'creditor-reference'(input) {
    return creditorReference(new InputReader(input, ['text']).text('text'));
  },

  convert(input) {
    const read = new InputReader(input, ['value', 'from', 'to']);
    const [from, to] = [readUnit(read, 'from'), readUnit(read, 'to')];
    const value = read.decimal('value');
    if (value.startsWith('-')) {
      throw new InvalidInput('value', 'An area or a thickness is 0 or more: leave out the minus.');
    }
    return { value: convert(value, from, to).toNumber() };
  },
};

/**
 * An amount as text is money, in as many places as it is written with and at least 2; a whole
 * number as a JSON number counts things, and its parts are whole numbers.
 */
function answerAllocate(input: unknown) {
  const read = new InputReader(input, ['amount', 'weights']);
  const amount = read.any('amount');
  const weights = read.list('weights', asDecimal);
  if (typeof amount === 'number' && Number.isInteger(amount)) {
    return { parts: allocate(asDecimal(amount, 'amount'), weights, 0).map(Number) };
  }
  const text = asDecimal(amount, 'amount');
  return { parts: allocate(text, weights, Math.max(2, text.split('.')[1]?.length ?? 0)) };
}

function readUnit(read: InputReader, name: string): Unit {
  const unit = read.text(name);
  if (!isUnit(unit)) throw new InvalidInput(name, `Give ${name} as one of ${units.join(', ')}.`);
  return unit;
}
