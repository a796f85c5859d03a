import compression from 'compression';
import type { Request, RequestHandler } from 'express';

/** Compresses replies on their way through a network. */
export function compressed(): RequestHandler {
  return compression({
    filter: (request, response) => !fromHere(request) && compression.filter(request, response),
  });
}

/** Whoever asks from this machine itself, with no proxy in between, would only wait for the packing. */
function fromHere({ socket, headers }: Request): boolean {
  const proxied = ['forwarded', 'x-forwarded-for', 'via'].some((name) => name in headers);
  return loopback.test(socket.remoteAddress ?? '') && !proxied;
}

const loopback = /^(::1$|(::ffff:)?127\.)/;
