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
  if (role !== undefined && hiddenFrom.get(schema)?.includes(role)) return undefined;
  if (value === null || value === undefined) return value;
  if (schema instanceof z.ZodObject && typeof value === 'object') {
    return visibleFields(schema, value as Record<string, unknown>, role);
  }
  if (schema instanceof z.ZodArray && Array.isArray(value)) {
    return value.map((item) => withoutConfidential(schema.element as z.ZodType, item, role));
  }
  if (schema instanceof z.ZodUnion)
    return withoutConfidential(branchFor(schema, value), value, role);
  if (schema instanceof z.ZodRecord && typeof value === 'object') {
    const inner = schema.valueType as z.ZodType;
    return Object.fromEntries(
      Object.entries(value).map(([key, item]) => [key, withoutConfidential(inner, item, role)]),
    );
  }
  if (
    schema instanceof z.ZodOptional ||
    schema instanceof z.ZodNullable ||
    schema instanceof z.ZodDefault
  ) {
    return withoutConfidential(schema.unwrap() as z.ZodType, value, role);
  }
  return value;
}

function visibleFields(
  schema: z.ZodObject,
  value: Record<string, unknown>,
  role: Role | undefined,
) {
  const visible: Record<string, unknown> = {};
  for (const [name, field] of Object.entries(schema.shape)) {
    const shown = withoutConfidential(field as z.ZodType, value[name], role);
    if (shown !== undefined) visible[name] = shown;
  }
  return visible;
}

/** A value that fits no branch is a fault of ours, and must not slip through unfiltered. */
function branchFor(schema: z.ZodUnion, value: unknown): z.ZodType {
  const branch = schema.options.find((option) => (option as z.ZodType).safeParse(value).success);
  if (branch === undefined)
    throw new TypeError('The reply fits none of the shapes that its contract allows');
  return branch as z.ZodType;
}
