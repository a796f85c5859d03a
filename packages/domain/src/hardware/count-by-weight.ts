import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { countWords } from '../numbers/count-words.ts';
import { type DecimalText, Exact, readDecimal, readWhole } from '../numbers/decimal-text.ts';

export interface Weighing {
  /** pieces that were counted out and weighed, 1 to 1,000 */
  sampleCount: number;
  /** what they weigh without the tub, in g, above 0 */
  sampleGrams: DecimalText;
  /** what all of them weigh, the tub with them, in g */
  allGrams: DecimalText;
  /** what the empty tub weighs, in g; 0 where there is none */
  tareGrams: DecimalText;
  /** the smallest step that the scale shows, in g, above 0 */
  scaleStepGrams: DecimalText;
}

export interface WeighedCount {
  /** the nearest whole number of pieces */
  count: number;
  /** the fewest and the most that would have shown the same on the scale; where none would, the whole numbers around */
  atLeast: number;
  atMost: number;
  /** says the count and how sure it is */
  sentence: string;
}

/**
 * How many pieces lie in a tub, by weighing a few and all: (all − tare) / (sample / count). Each reading may be half a
 * step of the scale off, which gives the fewest and the most; that pieces differ among themselves is not in it. Where
 * no whole number of pieces weighs that, it says so: something else lies in the tub, or a reading is wrong.
 * @throws InvalidInput
 */
export function countByWeight(weighing: Weighing): WeighedCount {
  const { pieces, sample, all, tare, half } = read(weighing);
  const net = all.minus(tare);
  const each = sample.div(pieces);
  // Two readings stand behind what all weigh where there is a tub.
  const slack = tare.isZero() ? half : half.times(2);
  if (sample.lte(half)) throw tooLight();
  const least = Exact.max(0, net.minus(slack)).times(pieces).div(sample.plus(half));
  const most = net.plus(slack).times(pieces).div(sample.minus(half));
  const [atLeast, atMost] = [least.ceil().toNumber(), most.floor().toNumber()];
  const nearest = net.div(each).toDecimalPlaces(0).toNumber();
  if (atLeast > atMost) {
    const around = { atLeast: atMost, atMost: atLeast };
    return { count: nearest, ...around, sentence: sayNoneFits(around) };
  }
  const count = Math.min(Math.max(nearest, atLeast), atMost);
  return { count, atLeast, atMost, sentence: sayCount(count, atLeast, atMost) };
}

function read({ sampleCount, sampleGrams, allGrams, tareGrams, scaleStepGrams }: Weighing) {
  const grams = (text: DecimalText, field: string) =>
    readDecimal(text, field, { min: 0, max: 1_000_000 });
  const pieces = readWhole(sampleCount, 'sampleCount', 1, 1000);
  const sample = grams(sampleGrams, 'sampleGrams');
  if (sample.isZero()) throw new InvalidInput('sampleGrams', 'Enter what they weigh, above 0 g.');
  const [all, tare] = [grams(allGrams, 'allGrams'), grams(tareGrams, 'tareGrams')];
  if (all.lt(tare)) {
    const sentence = 'All of it weighs less than the empty tub. Weigh both again.';
    throw new InvalidInput('allGrams', sentence);
  }
  const step: Decimal = grams(scaleStepGrams, 'scaleStepGrams');
  if (step.isZero()) {
    throw new InvalidInput('scaleStepGrams', 'Enter the smallest step of the scale, such as 0.1.');
  }
  return { pieces, sample, all, tare, half: step.div(2) };
}

const tooLight = () =>
  new InvalidInput('sampleGrams', 'That is too light for this scale. Weigh more pieces together.');

const sayNoneFits = ({ atLeast, atMost }: Pick<WeighedCount, 'atLeast' | 'atMost'>): string =>
  `Between ${countWords(atLeast)} and ${countWords(atMost)} pieces: no whole number weighs that. Empty the tub of anything else, and weigh both again.`;

function sayCount(count: number, atLeast: number, atMost: number): string {
  const pieces = `${countWords(count)} ${count === 1 ? 'piece' : 'pieces'}`;
  if (atLeast === atMost) return `${pieces}, certain to the piece by this scale.`;
  const range = `from ${countWords(atLeast)} to ${countWords(atMost)}`;
  return `About ${pieces}: by this scale anything ${range}. Weigh more pieces as the sample to be surer.`;
}
