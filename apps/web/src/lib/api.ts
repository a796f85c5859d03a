import {
  problem,
  type BodyInputOf,
  type Endpoint,
  type ParamsOf,
  type QueryInputOf,
  type ReplyOf,
} from '@hidewright/contract';
import { ApiProblem, unreachable } from './api-problem.ts';
import { randomKey } from './random-key.ts';

type Given<Name extends string, Value> = [Value] extends [undefined]
  ? { [K in Name]?: undefined }
  : { [K in Name]: Value };

export type CallInput<E extends Endpoint> = Given<'params', ParamsOf<E>> &
  Given<'body', BodyInputOf<E>> & {
    query?: QueryInputOf<E> | undefined;
    /** A file that is sent as it is, for an endpoint that takes one. */
    bytes?: Blob | undefined;
    /** The version that was read, for an endpoint that edits. */
    ifMatch?: number | undefined;
    /** Given for a retry of the same submit; made afresh otherwise. */
    idempotencyKey?: string | undefined;
    signal?: AbortSignal | undefined;
  };

type LooseInput = {
  params?: unknown | undefined;
  query?: unknown | undefined;
  body?: unknown | undefined;
  bytes?: Blob | undefined;
  ifMatch?: number | undefined;
  idempotencyKey?: string | undefined;
  signal?: AbortSignal | undefined;
};

/** Asks the API for one thing: typed by the contract on the way out, checked against it on the way in. */
export async function call<E extends Endpoint>(
  endpoint: E,
  ...[input]: Record<never, never> extends CallInput<E> ? [CallInput<E>?] : [CallInput<E>]
): Promise<ReplyOf<E>> {
  const given: LooseInput = input ?? {};
  const response = await send(endpoint, given);
  if (!response.ok) throw await problemOf(response);
  const body: unknown = response.status === 204 ? undefined : await response.json();
  return endpoint.reply.parse(body) as ReplyOf<E>;
}

/** The address of an endpoint, as for a link to a file. */
export function addressOf<E extends Endpoint>(
  endpoint: E,
  input: { params?: ParamsOf<E>; query?: QueryInputOf<E> } = {},
): string {
  const params = (input.params ?? {}) as Record<string, unknown>;
  const path = endpoint.path.replace(/\{(\w+)\}/g, (_, name: string) =>
    encodeURIComponent(String(params[name])),
  );
  return `/api${path}${searchOf(input.query)}`;
}

function searchOf(query: unknown): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query ?? {})) {
    for (const item of Array.isArray(value) ? value : [value]) {
      if (item !== undefined && item !== null && item !== '') search.append(name, String(item));
    }
  }
  return search.size === 0 ? '' : `?${search}`;
}

async function send(endpoint: Endpoint, given: LooseInput): Promise<Response> {
  const init: RequestInit = {
    method: endpoint.method,
    headers: headersFor(endpoint, given),
    credentials: 'same-origin',
  };
  if (given.body !== undefined) init.body = JSON.stringify(given.body);
  if (given.bytes) init.body = given.bytes;
  if (given.signal) init.signal = given.signal;
  const address = addressOf(endpoint, { params: given.params, query: given.query });
  try {
    return await fetch(address, init);
  } catch (cause) {
    if (given.signal?.aborted) throw cause;
    throw unreachable();
  }
}

function headersFor(endpoint: Endpoint, given: LooseInput): Record<string, string> {
  const headers: Record<string, string> = { accept: 'application/json' };
  if (given.body !== undefined) headers['content-type'] = 'application/json';
  if (given.bytes) headers['content-type'] = given.bytes.type;
  if (endpoint.creates) headers['idempotency-key'] = given.idempotencyKey ?? randomKey();
  if (given.ifMatch !== undefined) headers['if-match'] = `"${given.ifMatch}"`;
  return headers;
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const body: unknown = await response.json().catch(() => undefined);
  const parsed = problem.safeParse(body);
  return new ApiProblem(parsed.success ? parsed.data : { status: response.status });
}
