import { randomUUID } from 'node:crypto';
import type { ErrorRequestHandler } from 'express';
import { UniqueConstraintViolationException } from '@mikro-orm/core';
import { DomainError, InvalidInput } from '@hidewright/domain';
import type { ProblemBody } from '@hidewright/contract';
import { Problem, invalid } from './problem.ts';

/** The one place where an error becomes a reply; what went wrong inside is logged, never sent. */
export const errorHandler: ErrorRequestHandler = (error, request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  const problem = asProblem(error);
  const requestId = String(request.id ?? randomUUID());
  if (problem.status >= 500)
    request.log.error({ err: error as unknown, requestId }, 'request failed');
  const { headers, ...extras } = problem.extras;
  const body: ProblemBody = {
    type: 'about:blank',
    title: problem.title,
    status: problem.status,
    detail: problem.message,
    ...extras,
    requestId,
  };
  response.set(headers ?? {});
  response.status(problem.status).type('application/problem+json').send(JSON.stringify(body));
};

function asProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (error instanceof InvalidInput)
    return invalid([{ field: error.field, message: error.message }]);
  if (error instanceof DomainError)
    return new Problem(422, 'Please check what you entered', error.message);
  if (error instanceof UniqueConstraintViolationException) {
    return new Problem(
      409,
      'Already there',
      'Something with that name or number is there already. Choose another one.',
    );
  }
  return asBodyProblem(error) ?? asLockedPeriod(error) ?? unexpected();
}

/** The body parser's own errors: too large, or not JSON. */
function asBodyProblem(error: unknown): Problem | undefined {
  if (!(error instanceof Error) || !('type' in error)) return undefined;
  if (error.type === 'entity.too.large') {
    return new Problem(413, 'Too large', 'That is more than can be taken in one go. Send less.');
  }
  if (error.type === 'entity.parse.failed' || error.type === 'encoding.unsupported') {
    return new Problem(
      400,
      'Not readable',
      'The request is not valid JSON. Correct it and send it again.',
    );
  }
  return undefined;
}

function asLockedPeriod(error: unknown): Problem | undefined {
  if (!(error instanceof Error) || !error.message.includes('the period is locked'))
    return undefined;
  return new Problem(409, 'Locked', 'That day lies in a locked period. Choose a later day.');
}

function unexpected(): Problem {
  return new Problem(
    500,
    'Something went wrong',
    'Nothing was changed. Try again; if it stays, look at the log.',
  );
}
