import { z } from 'zod';
import type { Role } from './endpoint.ts';

const hiddenFrom = new WeakMap<z.ZodType, readonly Role[]>();

/**
 * A field that the maker never receives: prices, margins, and how to reach a customer. It is left out of the
 * maker's replies altogether, so every reader of the reply must do without it.
 */
export function confidential<T extends z.ZodType>(schema: T): z.ZodOptional<T> {
  const hidden = schema.optional();
  hiddenFrom.set(hidden, ['maker']);
  return hidden;
}

/** Takes out of a reply whatever its schema hides from the role; the rest is the same object graph, copied. */
export function withoutConfidential(
  schema: z.ZodType,
  value: unknown,
  role: Role | undefined,
): unknown {
  return sieveFor(schema, role)(value);
}

type Sieve = (value: unknown) => unknown;

/** A schema is read once for each role: a list runs through the same one for every row. */
const sieves = new Map<Role | undefined, WeakMap<z.ZodType, Sieve>>();

function sieveFor(schema: z.ZodType, role: Role | undefined): Sieve {
  const known = sieves.get(role) ?? new WeakMap<z.ZodType, Sieve>();
  sieves.set(role, known);
  const sieve = known.get(schema) ?? makeSieve(schema, role);
  known.set(schema, sieve);
  return sieve;
}

const whole: Sieve = (value) => value;
const nothing: Sieve = () => undefined;

function makeSieve(schema: z.ZodType, role: Role | undefined): Sieve {
  if (role !== undefined && hiddenFrom.get(schema)?.includes(role)) return nothing;
  if (schema instanceof z.ZodObject) return fieldsOf(schema, role);
  if (schema instanceof z.ZodArray) {
    const inner = sieveFor(schema.element as z.ZodType, role);
    return (value) => (Array.isArray(value) ? value.map(inner) : value);
  }
  if (schema instanceof z.ZodUnion)
    return (value) => (isNothing(value) ? value : sieveFor(branchFor(schema, value), role)(value));
  if (schema instanceof z.ZodRecord) {
    const inner = sieveFor(schema.valueType as z.ZodType, role);
    return (value) =>
      isObject(value)
        ? Object.fromEntries(Object.entries(value).map(([key, item]) => [key, inner(item)]))
        : value;
  }
  if (
    schema instanceof z.ZodOptional ||
    schema instanceof z.ZodNullable ||
    schema instanceof z.ZodDefault
  ) {
    return sieveFor(schema.unwrap() as z.ZodType, role);
  }
  return whole;
}

const isNothing = (value: unknown): boolean => value === null || value === undefined;
const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

function fieldsOf(schema: z.ZodObject, role: Role | undefined): Sieve {
  const fields = Object.entries(schema.shape).map(
    ([name, field]) => [name, sieveFor(field as z.ZodType, role)] as const,
  );
  return (value) => {
    if (!isObject(value)) return value;
    const visible: Record<string, unknown> = {};
    for (const [name, sieve] of fields) {
      const shown = sieve(value[name]);
      if (shown !== undefined) visible[name] = shown;
    }
    return visible;
  };
}

/** A value that fits no branch is a fault of ours, and must not slip through unfiltered. */
function branchFor(schema: z.ZodUnion, value: unknown): z.ZodType {
  const branch = schema.options.find((option) => (option as z.ZodType).safeParse(value).success);
  if (branch === undefined)
    throw new TypeError('The reply fits none of the shapes that its contract allows');
  return branch as z.ZodType;
}
