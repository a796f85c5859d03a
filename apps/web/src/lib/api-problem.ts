import type { ProblemBody } from '@hidewright/contract';

export interface FieldError {
  field: string;
  message: string;
}

/** What the API refused, and why, in words that a person can act on. Status 0: it could not be reached. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly title: string;
  readonly detail: string;
  readonly fieldErrors: readonly FieldError[];
  readonly allowed: readonly string[];
  readonly changed: ProblemBody['changed'];
  readonly requestId: string | undefined;

  constructor(body: Partial<ProblemBody> & { status: number }) {
    const title = body.title ?? 'Something went wrong';
    super(body.detail ?? title);
    this.name = 'ApiProblem';
    this.status = body.status;
    this.title = title;
    this.detail = body.detail ?? 'Try again in a moment.';
    this.fieldErrors = body.errors ?? [];
    this.allowed = body.allowed ?? [];
    this.changed = body.changed;
    this.requestId = body.requestId;
  }

  /** Whether the same request may succeed later: then its idempotency key must be kept. */
  get isPassing(): boolean {
    return this.status === 0 || this.status === 429 || this.status >= 500;
  }
}

export function unreachable(): ApiProblem {
  return new ApiProblem({
    status: 0,
    title: 'The workshop’s computer cannot be reached',
    detail: 'Check the network, then try again. What you typed is still here.',
  });
}
