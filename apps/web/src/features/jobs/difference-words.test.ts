import type { JobVariances, StepDifference } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { moreOrLess, reasonsFor, stepInWords } from './difference-words.ts';

const stamp: StepDifference = {
  ...{ name: 'Stamp', per: 'strike', handled: 56 },
  ...{ saidMinutes: '16', saidForMade: '16.2', wasMinutes: '19' },
  money: { time: '1.03', made: '0.07', wage: '0.00' },
};

describe('why a run cost other than was said', () => {
  it('is told in sentences, the largest first, without what made no difference', () => {
    const found: JobVariances = {
      steps: [stamp],
      wages: { other: '-0.01', sum: '1.09' },
      bought: [
        {
          ...{ kind: 'leather', name: 'Oak tan', price: '-4.10', usage: '0.00', made: '2.00' },
          ...{ other: '0.01', sum: '-2.09' },
        },
      ],
      sum: '-1.00',
    };
    expect(reasonsFor(found)).toEqual([
      'Oak tan cost 4.10 less because it was cheaper.',
      'Oak tan cost 2.00 more because more good pieces came out than were ordered.',
      'Stamp cost 1.03 more because it took longer.',
      'Stamp cost 0.07 more because it had more to handle.',
    ]);
  });

  it('says of a step how its minutes differ for what it handled', () => {
    expect(stepInWords(stamp)).toBe('2.8 min more than said for 56 strikes');
    expect(stepInWords({ ...stamp, wasMinutes: null })).toBe(
      'nothing logged; 16.2 min said for 56 strikes',
    );
    expect(stepInWords({ ...stamp, wasMinutes: '16.2', per: 'run', handled: 1 })).toBe(
      'as said for the run',
    );
  });

  it('says nought as such', () => expect(moreOrLess('0.00')).toBe('as much as was said'));
});
