import { paybackYears } from '../money/payback.ts';
import { presentValue } from '../money/present-value.ts';
import { priceInversions, priceRises } from '../pricing/price-breaks.ts';
import { choosePlate, type PlateOffer } from '../tooling/plate-choice.ts';
import { flowTime } from '../work/flow-time.ts';
import { learnedTime } from '../work/learning.ts';
import type { Answers } from './answers.ts';
import { asDecimal, asNumber, InputReader } from './read-input.ts';
import { asPriceBreak } from './read-price-break.ts';

/** The numbers of a run. */
export const runAnswers: Answers = {
  'flow-time'(input) {
    const read = new InputReader(input, ['quantity', 'times', 'transfer']);
    const [quantity, transfer] = [read.number('quantity'), read.number('transfer')];
    return { makespan: flowTime({ quantity, times: read.list('times', asNumber), transfer }) };
  },

  learning(input) {
    const read = new InputReader(input, ['model', 'curve', 'n']);
    const model = read.choice('model', ['unit', 'cumulative']);
    return learnedTime(model, read.number('curve'), read.number('n'));
  },

  'present-value'(input) {
    const read = new InputReader(input, ['rate', 'flows']);
    return { value: presentValue(read.number('rate'), read.list('flows', asDecimal)) };
  },

  payback(input) {
    const read = new InputReader(input, ['flows']);
    return { years: paybackYears(read.list('flows', asDecimal)) };
  },

  'plate-choice'(input) {
    const read = new InputReader(input, ['impressions', 'plates']);
    return choosePlate(read.number('impressions'), read.list('plates', asPlate));
  },

  'price-breaks'(input) {
    const breaks = new InputReader(input, ['breaks']).list('breaks', asPriceBreak);
    return { inversions: priceInversions(breaks), risesAt: priceRises(breaks) };
  },
};

function asPlate(value: unknown, field: string): PlateOffer {
  const read = new InputReader(value, ['metal', 'price', 'life', 'used'], field);
  return {
    metal: read.text('metal'),
    price: read.decimal('price'),
    life: read.number('life'),
    ...(read.has('used') && { used: read.number('used') }),
  };
}
