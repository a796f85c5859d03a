import type { z } from 'zod';

export const roles = ['owner', 'maker', 'bookkeeper'] as const;
export type Role = (typeof roles)[number];

/**
 * Who may call: a list of roles, `anyone` (no session asked), or `link` (a customer's signed link, whose token
 * is in the path). There is no default: an endpoint that names nobody does not type-check.
 */
export type Access = readonly [Role, ...Role[]] | 'anyone' | 'link';

/** One thing the API does: the single source of its route, its rule, its checks, its client and its documentation. */
export interface Endpoint<
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Reply extends z.ZodType = z.ZodType,
> {
  readonly method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Below `/api`, with `{name}` for each parameter. */
  readonly path: string;
  readonly summary: string;
  readonly access: Access;
  readonly params?: Params;
  readonly query?: Query;
  readonly body?: Body;
  readonly reply: Reply;
  /** The request's body is a file of one of these types, sent as it is; the sentences say what to send instead. */
  readonly takes?: {
    readonly types: readonly string[];
    readonly mostBytes: number;
    readonly refusal: { readonly type: string; readonly bytes: string };
  };
  /** 201, and an `Idempotency-Key` is honoured. */
  readonly creates?: boolean;
  /** 202: the work goes on after the reply. Asking again joins it, so no key is needed. */
  readonly starts?: boolean;
  /** The `If-Match` header must name the version that was read. */
  readonly edits?: boolean;
  /** The reply is a file, sent as it is: `reply` then describes nothing. */
  readonly file?: string;
}

/** Keeps the precise types of an endpoint's schemas. */
export function endpoint<
  Reply extends z.ZodType,
  Params extends z.ZodType = z.ZodUndefined,
  Query extends z.ZodType = z.ZodUndefined,
  Body extends z.ZodType = z.ZodUndefined,
>(definition: Endpoint<Params, Query, Body, Reply>): Endpoint<Params, Query, Body, Reply> {
  return definition;
}

/** The status of a reply that is no refusal. */
export function statusOf({ creates, starts }: Endpoint): 200 | 201 | 202 {
  if (creates === true) return 201;
  return starts === true ? 202 : 200;
}

export type ParamsOf<E> =
  E extends Endpoint<infer P, z.ZodType, z.ZodType, z.ZodType> ? z.output<P> : never;
export type QueryOf<E> =
  E extends Endpoint<z.ZodType, infer Q, z.ZodType, z.ZodType> ? z.output<Q> : never;
export type QueryInputOf<E> =
  E extends Endpoint<z.ZodType, infer Q, z.ZodType, z.ZodType> ? z.input<Q> : never;
export type BodyOf<E> =
  E extends Endpoint<z.ZodType, z.ZodType, infer B, z.ZodType> ? z.output<B> : never;
export type BodyInputOf<E> =
  E extends Endpoint<z.ZodType, z.ZodType, infer B, z.ZodType> ? z.input<B> : never;
export type ReplyOf<E> =
  E extends Endpoint<z.ZodType, z.ZodType, z.ZodType, infer R> ? z.output<R> : never;
