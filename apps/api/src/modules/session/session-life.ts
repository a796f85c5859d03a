import type { Request } from 'express';

/** A new session id at sign-in, so that an id known beforehand is worth nothing. */
export function startSession(request: Request, person: Express.User): Promise<void> {
  return settled((done) => {
    // passport draws the new id itself, and keeps the session before it answers.
    request.logIn(person, done);
  });
}

/** Ends the session on the server, not only in the browser. */
export function endSession(request: Request): Promise<void> {
  return settled((done) => {
    request.session.destroy(done);
  });
}

function settled(start: (done: (error?: unknown) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => {
    start((error) => {
      if (error === undefined || error === null) resolve();
      else
        reject(
          error instanceof Error
            ? error
            : new Error('The session could not be kept', { cause: error }),
        );
    });
  });
}
