import type { Request } from 'express';
import type { BodyOf, Endpoint, ParamsOf, QueryOf } from '@hidewright/contract';
import type { z } from 'zod';
import { readIfMatch } from './conditions.ts';
import { invalid, Problem, type FieldFault } from './problem.ts';

/** A request after its endpoint's schemas have read it. */
export interface Asked<E extends Endpoint> {
  params: ParamsOf<E>;
  query: QueryOf<E>;
  body: BodyOf<E>;
  /** What was sent as it is; empty where the endpoint takes no file. */
  bytes: Buffer;
  /** The version named by If-Match; 0 where the endpoint edits nothing. */
  ifMatch: number;
  /** The address under which the caller reached us, as it was said: good for the words of a link, never for a decision. */
  origin: string;
}

/** @throws {Problem} when the request is not what the endpoint takes */
export function readAsked<E extends Endpoint>(endpoint: E, request: Request): Asked<E> {
  return {
    params: read(endpoint.params, request.params, true) as ParamsOf<E>,
    query: read(endpoint.query, request.query, false) as QueryOf<E>,
    body: readBody(endpoint, request) as BodyOf<E>,
    bytes: Buffer.isBuffer(request.body) ? request.body : Buffer.alloc(0),
    ifMatch: endpoint.edits === true ? readIfMatch(request.get('If-Match')) : 0,
    origin: `${request.protocol}://${request.get('Host') ?? 'localhost'}`,
  };
}

function readBody(endpoint: Endpoint, request: Request): unknown {
  if (endpoint.body === undefined) return undefined;
  if (
    request.body === undefined &&
    request.get('Content-Length') !== undefined &&
    request.get('Content-Length') !== '0'
  ) {
    throw new Problem(415, 'Not JSON', 'Send the request body as application/json.');
  }
  return read(endpoint.body, request.body ?? {}, false);
}

function read(schema: z.ZodType | undefined, value: unknown, inPath: boolean): unknown {
  if (schema === undefined) return undefined;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  // A path that names nothing that could exist is a thing that does not exist.
  if (inPath)
    throw new Problem(404, 'Not found', 'There is nothing at this address. Go back to the list.');
  throw invalid(parsed.error.issues.flatMap(faultsOf));
}

function faultsOf(issue: z.core.$ZodIssue): FieldFault[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      field: [...issue.path, key].join('.'),
      message: `${key} is not asked for here. Leave it out.`,
    }));
  }
  if (issue.code === 'invalid_union') {
    const closest = [...issue.errors].sort((a, b) => a.length - b.length)[0] ?? [];
    const inner = closest.flatMap(faultsOf);
    if (inner.length > 0) {
      return inner.map((fault) => ({
        ...fault,
        field: [...issue.path, fault.field].filter(String).join('.'),
      }));
    }
  }
  return [{ field: issue.path.join('.'), message: issue.message }];
}
