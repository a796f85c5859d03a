import { quoteTerms, runAsAsked, type QuoteTerms, type RunBasis } from '@hidewright/contract';
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
  breaks?: { quantity?: unknown; typedPrice?: unknown; rule?: unknown }[];
  tooling?: { name?: unknown; cost?: unknown; charge?: unknown }[];
  overrides?: { rejectPercent?: unknown; leatherPricePerFt2?: unknown };
  terms?: object | undefined;
}

export interface Preview {
  input: RunInput;
  numbers: RunNumbers;
}

/** The numbers of what is typed so far, by the same functions that price the saved quote; or why there are none. */
export function previewOf(basis: RunBasis, typed: TypedSoFar): Preview | { why: string } {
  const breaks = rungsOf(typed.breaks ?? []);
  if (breaks.length === 0) return { why: 'Enter a quantity, and its price is worked out here.' };
  try {
    const input = runAsAsked(basis, {
      breaks,
      tooling: (typed.tooling ?? []).flatMap(toolOf),
      overrides: {
        ...figures({
          rejectPercent: typed.overrides?.rejectPercent,
          leatherPricePerFt2: typed.overrides?.leatherPricePerFt2,
        }),
      },
      terms: soundTerms(typed.terms ?? {}),
    });
    return { input, numbers: priceRun(input) };
  } catch (error) {
    if (error instanceof DomainError) return { why: error.message };
    throw error;
  }
}

/** Rungs that are complete; a quantity that is there twice counts once. */
function rungsOf(typed: NonNullable<TypedSoFar['breaks']>): (Break & { rule: Rule })[] {
  const rungs = typed.flatMap(({ quantity, typedPrice, rule }) => {
    const pieces = Number(quantity);
    if (!Number.isInteger(pieces) || pieces < 1 || pieces > 100_000) return [];
    const terms = soundTerms({ priceRule: rule });
    return [{ quantity: pieces, typedPrice: figure(typedPrice) ?? null, rule: terms.priceRule }];
  });
  return rungs.filter(
    (rung, at) => rungs.findIndex((each) => each.quantity === rung.quantity) === at,
  );
}

type Rule = QuoteTerms['priceRule'];

/** The terms that are sound so far: each field by itself, so that one half typed does not hide the others. */
function soundTerms(typed: object): QuoteTerms {
  const sound = Object.entries(quoteTerms.shape).flatMap(([name, field]) => {
    const parsed = field.safeParse((typed as Record<string, unknown>)[name]);
    return parsed.success ? [[name, parsed.data]] : [];
  });
  return quoteTerms.parse(Object.fromEntries(sound));
}

function toolOf(typed: NonNullable<TypedSoFar['tooling']>[number]): RunTooling[] {
  const [cost, charge] = [figure(typed.cost) ?? '0', figure(typed.charge) ?? '0'];
  return [{ name: String(typed.name ?? ''), cost, charge }];
}

function figures<Name extends string>(typed: Record<Name, unknown>): Partial<Record<Name, string>> {
  const known = Object.entries(typed).flatMap(([name, value]) => {
    const text = figure(value);
    return text === undefined ? [] : [[name, text]];
  });
  return Object.fromEntries(known) as Partial<Record<Name, string>>;
}

/** A figure with at most four decimals, as text; undefined while it is none. */
function figure(value: unknown): string | undefined {
  return typeof value === 'string' && /^\d{1,9}(\.\d{1,4})?$/.test(value.trim())
    ? value.trim()
    : undefined;
}
