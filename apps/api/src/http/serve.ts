import type { Request, RequestHandler, Response, Router } from 'express';
import {
  statusOf,
  withoutConfidential,
  type Access,
  type Endpoint,
  type ReplyOf,
} from '@hidewright/contract';
import type { Context } from '../context.ts';
import { inTransaction, reading, type Actor, type Work } from '../work.ts';
import { readAsked, type Asked } from './asked.ts';
import { once, readRequestKey } from './idempotency.ts';
import { notYours, signInFirst } from './problem.ts';
import { readBytes } from './read-bytes.ts';

/** What an endpoint does; `prepared` is what its preparation, outside the transaction, brought. */
type Run<E extends Endpoint, Prepared> = (
  work: Work,
  asked: Asked<E>,
  prepared: Prepared,
) => Promise<ReplyOf<E>>;

/**
 * Puts an endpoint of the contract on a router: who may call, what it takes, one transaction when it changes
 * anything, and a reply that shows no more than the role may see.
 * @param prepare slow work that needs no transaction, such as hashing a password or waiting for a layout
 */
export function serve<E extends Endpoint, Prepared = undefined>(
  router: Router,
  context: Context,
  endpoint: E,
  run: Run<E, Prepared>,
  prepare?: (asked: Asked<E>, actor: Actor) => Promise<Prepared>,
): void {
  bind(router, endpoint, async (request, response) => {
    if (endpoint.takes) await readBytes(endpoint.takes, request, response);
    const asked = readAsked(endpoint, request);
    const actor = actorOf(request);
    const prepared = (await prepare?.(asked, actor)) as Prepared;
    const { reply, replayed } = await perform(context, endpoint, request, actor, (work) =>
      run(work, asked, prepared),
    );
    if (replayed) response.set('Idempotent-Replayed', 'true');
    sendReply(endpoint, response, reply, request.user?.role);
  });
}

/** A file that an endpoint sends as it is. */
export interface SentFile {
  name: string;
  type: string;
  bytes: Uint8Array;
}

/** Like `serve`, for endpoints whose reply is a file. */
export function serveFile<E extends Endpoint>(
  router: Router,
  context: Context,
  endpoint: E,
  run: (work: Work, asked: Asked<E>) => Promise<SentFile>,
): void {
  bind(router, endpoint, async (request, response) => {
    const asked = readAsked(endpoint, request);
    const file = await reading(context, actorOf(request), (work) => run(work, asked));
    response.attachment(file.name).type(file.type).send(Buffer.from(file.bytes));
  });
}

/** Registers a handler of its own behind the endpoint's rule; `serve` is what most endpoints want. */
export function bind(router: Router, endpoint: Endpoint, handler: RequestHandler): void {
  const path = endpoint.path.replaceAll(/\{(\w+)\}/g, ':$1');
  const method = endpoint.method.toLowerCase() as Lowercase<Endpoint['method']>;
  router[method](path, admit(endpoint.access), handler);
}

function admit(access: Access): RequestHandler {
  return (request, _response, next) => {
    if (typeof access !== 'string') {
      if (request.user === undefined) throw signInFirst();
      if (!access.includes(request.user.role)) throw notYours();
    }
    next();
  };
}

function actorOf(request: Request): Actor {
  if (request.user === undefined) return { id: null, name: 'The customer', role: 'customer' };
  return { id: request.user.id, name: request.user.name, role: request.user.role };
}

async function perform(
  context: Context,
  endpoint: Endpoint,
  request: Request,
  actor: Actor,
  run: (work: Work) => Promise<unknown>,
): Promise<{ reply: unknown; replayed: boolean }> {
  if (endpoint.method === 'GET')
    return { reply: await reading(context, actor, run), replayed: false };
  const key = endpoint.creates === true ? readRequestKey(request) : undefined;
  return inTransaction(context, actor, (work) =>
    once(work, key, statusOf(endpoint), () => run(work)),
  );
}

export function sendReply(
  endpoint: Endpoint,
  response: Response,
  reply: unknown,
  role: Express.User['role'] | undefined,
): void {
  const shown = withoutConfidential(endpoint.reply, reply, role);
  if (typeof shown === 'object' && shown !== null && 'version' in shown)
    response.set('ETag', `"${String(shown.version)}"`);
  response.status(statusOf(endpoint)).json(shown);
}
