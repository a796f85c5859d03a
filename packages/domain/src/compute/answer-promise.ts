import { InvalidInput } from '../errors/domain-error.ts';
import { type DueJob, fewestLate } from '../promise/late-jobs.ts';
import { orderForTwoMachines } from '../promise/two-machine.ts';
import type { Answers } from './answers.ts';
import { asNumber, InputReader } from './read-input.ts';

export const promiseAnswers: Answers = {
  'late-jobs'(input) {
    return fewestLate(new InputReader(input, ['jobs']).list('jobs', asDueJob));
  },

  'two-machine'(input) {
    return orderForTwoMachines(new InputReader(input, ['jobs']).list('jobs', asTwoTimes));
  },
};

function asDueJob(value: unknown, field: string): DueJob {
  const read = new InputReader(value, ['time', 'due'], field);
  return { time: read.number('time'), due: read.number('due') };
}

function asTwoTimes(value: unknown, field: string): [number, number] {
  if (!Array.isArray(value) || value.length !== 2) {
    throw new InvalidInput(field, `Give ${field} as a list of two times, [first, second].`);
  }
  return [asNumber(value[0], `${field}.0`), asNumber(value[1], `${field}.1`)];
}
