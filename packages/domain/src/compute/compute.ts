import { InvalidInput } from '../errors/domain-error.ts';
import { answerNest } from '../nest/answer-nest.ts';
import { bookAnswers } from './answer-books.ts';
import { promiseAnswers } from './answer-promise.ts';
import { rejectAnswers } from './answer-rejects.ts';
import { runAnswers } from './answer-run.ts';
import { stockAnswers } from './answer-stock.ts';
import type { Answers } from './answers.ts';

const answers: Answers = {
  ...rejectAnswers,
  ...runAnswers,
  ...promiseAnswers,
  ...stockAnswers,
  ...bookAnswers,
  layout: answerNest,
};

/** What `compute` can answer. */
export const computeNames = Object.keys(answers);

/**
 * Answers one question about the domain's numbers, for the command line. Numbers are JSON numbers,
 * amounts of money decimal text.
 * @throws InvalidInput for an unknown name and for input that makes no sense
 */
export function compute(name: string, input: unknown): object {
  const answer = Object.hasOwn(answers, name) ? answers[name] : undefined;
  if (!answer) {
    throw new InvalidInput(
      'name',
      `There is no ${name || 'nameless'} computation: choose ${computeNames.join(', ')}.`,
    );
  }
  return answer(input);
}
