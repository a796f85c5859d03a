import { InvalidInput } from '../errors/domain-error.ts';
import { Exact, toPlaces } from '../numbers/decimal-text.ts';
import { allocate } from '../money/allocate.ts';
import { answerNest } from '../nest/answer-nest.ts';
import { round } from '../money/round.ts';
import { rolledYield } from '../rejects/allowance.ts';
import { cutCount } from '../rejects/cut-count.ts';
import { convert, isUnit, type Unit, units } from '../units/convert.ts';
import { asDecimal, asNumber, InputReader } from './read-input.ts';

type Answer = Record<string, unknown>;

const answers: Record<string, (input: unknown) => Answer> = {
  'cut-count': answerCutCount,
  'rolled-yield': answerRolledYield,
  allocate: answerAllocate,
  round: answerRound,
  convert: answerConvert,
  layout: (input) => ({ ...answerNest(input) }),
};

/** What `compute` can answer. */
export const computeNames = Object.keys(answers);

/**
 * Answers one question about the domain's numbers, for the command line. Numbers are JSON numbers,
 * amounts of money decimal text.
 * @throws InvalidInput for an unknown name and for input that makes no sense
 */
export function compute(name: string, input: unknown): Answer {
  const answer = Object.hasOwn(answers, name) ? answers[name] : undefined;
  if (!answer) {
    throw new InvalidInput(
      'name',
      `There is no ${name || 'nameless'} computation: choose ${computeNames.join(', ')}.`,
    );
  }
  return answer(input);
}

function answerCutCount(input: unknown): Answer {
  const read = new InputReader(input, ['good', 'rate', 'history', 'confidence']);
  const asked = { good: read.number('good'), confidence: read.number('confidence') };
  if (read.has('rate') === read.has('history')) {
    throw new InvalidInput('rate', 'Give either rate or history, not both and not neither.');
  }
  if (read.has('rate')) return { ...cutCount({ ...asked, rate: read.number('rate') }) };
  const past = new InputReader(read.any('history'), ['good', 'total']);
  const history = { good: past.number('good'), total: past.number('total') };
  return { ...cutCount({ ...asked, history }) };
}

function answerRolledYield(input: unknown): Answer {
  const read = new InputReader(input, ['rates', 'good']);
  return rolledYield({ rates: read.list('rates', asNumber), good: read.number('good') });
}

/**
 * An amount as text is money, in as many places as it is written with and at least 2; a whole
 * number as a JSON number counts things, and its parts are whole numbers.
 */
function answerAllocate(input: unknown): Answer {
  const read = new InputReader(input, ['amount', 'weights']);
  const amount = read.any('amount');
  const weights = read.list('weights', asDecimal);
  if (typeof amount === 'number' && Number.isInteger(amount)) {
    return { parts: allocate(asDecimal(amount, 'amount'), weights, 0).map(Number) };
  }
  const text = asDecimal(amount, 'amount');
  return { parts: allocate(text, weights, Math.max(2, text.split('.')[1]?.length ?? 0)) };
}

function answerRound(input: unknown): Answer {
  const read = new InputReader(input, ['value', 'places', 'mode']);
  const mode = read.text('mode');
  if (mode !== 'halfUp' && mode !== 'halfEven') {
    throw new InvalidInput('mode', 'Give mode as halfUp or halfEven.');
  }
  const places = read.number('places');
  const rounded = toPlaces(round(new Exact(read.decimal('value')), places, mode), places);
  // An amount of money comes and goes as text; a number is answered by a number.
  return { value: typeof read.any('value') === 'number' ? Number(rounded) : rounded };
}

function answerConvert(input: unknown): Answer {
  const read = new InputReader(input, ['value', 'from', 'to']);
  const [from, to] = [readUnit(read, 'from'), readUnit(read, 'to')];
  return { value: convert(read.decimal('value'), from, to).toNumber() };
}

function readUnit(read: InputReader, name: string): Unit {
  const unit = read.text(name);
  if (!isUnit(unit)) throw new InvalidInput(name, `Give ${name} as one of ${units.join(', ')}.`);
  return unit;
}
