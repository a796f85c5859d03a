import { InvalidInput } from '../errors/domain-error.ts';
import { rolledYield } from '../rejects/allowance.ts';
import { cutCount } from '../rejects/cut-count.ts';
import { goodShareInterval } from '../rejects/interval.ts';
import type { Answers } from './answers.ts';
import { asNumber, InputReader } from './read-input.ts';

export const rejectAnswers: Answers = {
  'cut-count': answerCutCount,

  interval(input) {
    const read = new InputReader(input, ['good', 'total', 'confidence', 'method']);
    return goodShareInterval({
      good: read.number('good'),
      total: read.number('total'),
      confidence: read.number('confidence'),
      method: read.choice('method', ['wilson', 'jeffreys']),
    });
  },

  'rolled-yield'(input) {
    const read = new InputReader(input, ['rates', 'good']);
    return rolledYield({ rates: read.list('rates', asNumber), good: read.number('good') });
  },
};

function answerCutCount(input: unknown) {
  const read = new InputReader(input, ['good', 'rate', 'history', 'confidence']);
  const asked = { good: read.number('good'), confidence: read.number('confidence') };
  if (read.has('rate') === read.has('history')) {
    throw new InvalidInput('rate', 'Give either rate or history, not both and not neither.');
  }
  if (read.has('rate')) return cutCount({ ...asked, rate: read.number('rate') });
  const past = new InputReader(read.any('history'), ['good', 'total'], 'history');
  const history = { good: past.number('good'), total: past.number('total') };
  return cutCount({ ...asked, history });
}
