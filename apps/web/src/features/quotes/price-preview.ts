import type { RunBasis } from '@hidewright/contract';
import {
  DomainError,
  priceRun,
  type Break,
  type RunInput,
  type RunNumbers,
  type RunTooling,
} from '@hidewright/domain';

/** What stands in the form so far: anything may be missing or half typed. */
export interface TypedSoFar {
  breaks?: { quantity?: unknown; typedPrice?: unknown }[];
  tooling?: { name?: unknown; cost?: unknown; charge?: unknown }[];
  overrides?: { rejectPercent?: unknown; leatherPricePerFt2?: unknown };
}

export interface Preview {
  input: RunInput;
  numbers: RunNumbers;
}

/** The numbers of what is typed so far, by the same function that prices the saved quote; or why there are none. */
export function previewOf(basis: RunBasis, typed: TypedSoFar): Preview | { why: string } {
  const input = inputOf(basis.input, typed);
  if (input.breaks.length === 0)
    return { why: 'Enter a quantity, and its price is worked out here.' };
  try {
    return { input, numbers: priceRun(input) };
  } catch (error) {
    if (error instanceof DomainError) return { why: error.message };
    throw error;
  }
}

function inputOf(basis: RunInput, typed: TypedSoFar): RunInput {
  const price = figure(typed.overrides?.leatherPricePerFt2);
  return {
    ...basis,
    breaks: rungsOf(typed.breaks ?? []),
    tooling: (typed.tooling ?? []).flatMap(toolOf),
    leather: price === undefined ? basis.leather : { ...basis.leather, pricePerFt2: price },
    work: workOf(basis.work, figure(typed.overrides?.rejectPercent)),
  };
}

/** Rungs that are complete; a quantity that is there twice counts once. */
function rungsOf(typed: NonNullable<TypedSoFar['breaks']>): Break[] {
  const rungs = typed.flatMap(({ quantity, typedPrice }): Break[] => {
    const pieces = Number(quantity);
    if (!Number.isInteger(pieces) || pieces < 1 || pieces > 100_000) return [];
    return [{ quantity: pieces, typedPrice: figure(typedPrice) ?? null }];
  });
  return rungs.filter(
    (rung, at) => rungs.findIndex((each) => each.quantity === rung.quantity) === at,
  );
}

function toolOf(typed: NonNullable<TypedSoFar['tooling']>[number]): RunTooling[] {
  const [cost, charge] = [figure(typed.cost) ?? '0', figure(typed.charge) ?? '0'];
  return [{ name: String(typed.name ?? ''), cost, charge }];
}

function workOf(plan: RunInput['work'], rejects: string | undefined): RunInput['work'] {
  return rejects === undefined || plan.kind === 'steps'
    ? plan
    : { ...plan, rejectPercent: rejects };
}

/** A figure with at most four decimals, as text; undefined while it is none. */
function figure(value: unknown): string | undefined {
  return typeof value === 'string' && /^\d{1,9}(\.\d{1,4})?$/.test(value.trim())
    ? value.trim()
    : undefined;
}
