export interface FieldFault {
  field: string;
  message: string;
}

interface ProblemExtras {
  errors?: FieldFault[];
  allowed?: string[];
  changed?: { by: string; at: string; what: string };
  headers?: Record<string, string>;
}

/** A refusal that the person can do something about; the error handler turns it into RFC 9457 problem details. */
export class Problem extends Error {
  readonly status: number;
  readonly title: string;
  readonly extras: ProblemExtras;

  constructor(status: number, title: string, detail: string, extras: ProblemExtras = {}) {
    super(detail);
    this.name = 'Problem';
    this.status = status;
    this.title = title;
    this.extras = extras;
  }
}

export function notFound(what: string): Problem {
  return new Problem(
    404,
    'Not found',
    `There is no such ${what}. It may have been removed; go back to the list.`,
  );
}

/** 409: the thing is in a state that does not allow this, with what it does allow. */
export function wrongState(detail: string, allowed: string[] = []): Problem {
  return new Problem(409, 'Not possible now', detail, { allowed });
}

/** 422: what was typed makes no sense, field by field. */
export function invalid(errors: FieldFault[]): Problem {
  return new Problem(422, 'Please check what you entered', errors.map((e) => e.message).join(' '), {
    errors,
  });
}

export function signInFirst(): Problem {
  return new Problem(
    401,
    'Sign in first',
    'You are not signed in, or your session has ended. Sign in and try again.',
  );
}

export function notYours(): Problem {
  return new Problem(
    403,
    'Not for your role',
    'Your role does not allow this. Ask the owner of the shop.',
  );
}
