import { quoteTerms, type AskedRun, type PatternDefinition } from '@hidewright/contract';
import { addDays, addWorkdays, type CutFrom, type Layout } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Context } from '../../context.ts';
import { invalid, Problem } from '../../http/problem.ts';
import { Order } from '../../modules/orders/order.entity.ts';
import { PatternVersion } from '../../modules/patterns/pattern-version.entity.ts';
import { definitionOf } from '../../modules/patterns/pattern-versions.ts';
import { numbersOfQuote } from '../../modules/quotes/quote-numbers.ts';
import { Quote } from '../../modules/quotes/quote.entity.ts';
import type { Work } from '../../work.ts';
import { layPatterns, type LaidPattern } from '../lay-pattern.ts';
import { hardwareKinds, type Kinds } from '../run-hardware.ts';
import { runInputFor } from '../run-input.ts';
import { planOf, planRun, type RunPlan } from '../run-plan.ts';

/** A run as it is checked, planned whole. */
export interface PlannedRun {
  /** "Q-0012 Heron tags", or the pattern's name. */
  name: string;
  /** The same as a supplier may read it. */
  paper: string;
  quoteId: number | null;
  /** Null where nobody is named yet. */
  customerId: number | null;
  option: string | null;
  by: string;
  plan: RunPlan;
  definition: PatternDefinition;
  sides: CutFrom['sides'];
}

/** A day that can be promised: not over, and within two years. @throws {Problem} 422 */
export function requireReachable({ today }: Work, day: string, field: string): void {
  if (day < today)
    throw invalid([{ field, message: 'That day is over. Choose today or a day to come.' }]);
  if (day > addDays(today, 731))
    throw invalid([{ field, message: 'That is more than two years off. Choose a nearer day.' }]);
}

/**
 * How the patterns that are asked for without a quote are laid out; a worker may have to work it out, so this comes
 * before the transaction.
 * @throws {Problem} 422 naming the run
 */
export async function layAskedPatterns(
  context: Pick<Context, 'orm' | 'workers'>,
  runs: readonly AskedRun[],
): Promise<(LaidPattern | null)[]> {
  const asked = runs.flatMap(({ patternId }, at) =>
    patternId === null || patternId === undefined ? [] : [{ patternId, at }],
  );
  const laid = await layPatterns(
    context,
    asked.map(({ patternId }) => patternId),
    (at) => {
      const message = 'This pattern is not there. Choose one from the list.';
      return invalid([{ field: `runs.${asked[at]?.at}.patternId`, message }]);
    },
  );
  return runs.map((_, at) => laid[asked.findIndex((each) => each.at === at)] ?? null);
}

/** @throws {Problem} 422 naming the run and what is wrong with it */
export async function planAskedRuns(
  work: Work,
  runs: readonly AskedRun[],
  laid: readonly (LaidPattern | null)[],
): Promise<PlannedRun[]> {
  const planned: PlannedRun[] = [];
  const definitions = laid.flatMap((pattern) => (pattern === null ? [] : [pattern.definition]));
  const kinds = await hardwareKinds(work, definitions);
  for (const [at, run] of runs.entries()) {
    const field = `runs.${at}`;
    const pattern = laid[at] ?? null;
    planned.push(
      pattern === null
        ? await planQuoted(work, await askedQuote(work.em, run, field), run, field)
        : await planPattern(work, { ...pattern, kinds }, run, field),
    );
  }
  return planned;
}

async function askedQuote(em: EntityManager, { quoteId }: AskedRun, field: string): Promise<Quote> {
  const refuse = (message: string) => invalid([{ field: `${field}.quoteId`, message }]);
  const quote = await em.findOne(Quote, quoteId ?? 0);
  if (quote === null) throw refuse('This quote is not there. Choose one from the list.');
  const order = await em.findOne(Order, { quoteId: quote.id });
  if (order !== null) {
    throw refuse(`${quote.number} is taken on as ${order.number}: what it needs is held already.`);
  }
  if (quote.state === 'draft' || quote.state === 'sent' || quote.state === 'agreed') return quote;
  throw refuse(`${quote.number} is ${quote.state}. Choose a quote that is still open.`);
}

type Wanted = Pick<AskedRun, 'quantity' | 'option' | 'by'>;

/**
 * A quote's run, at what was asked, or else what was agreed, or else the least that is offered.
 * @param field where the run was asked; '' for the only one
 */
export async function planQuoted(
  work: Work,
  quote: Quote,
  { quantity, option, by }: Wanted,
  field = '',
): Promise<PlannedRun> {
  const day = by ?? usualDay(work, quote.inHandsOn);
  requireReachable(work, day, within(field, 'by'));
  const least = Math.min(...numbersOfQuote(quote).breaks.map((rung) => rung.quantity));
  const chosen = option === undefined ? quote.agreedOption : option;
  requireOption(quote, chosen, within(field, 'option'));
  const plan = await planRun(work.em, quote, quantity ?? quote.agreedQuantity ?? least, chosen);
  const version = await work.em.findOneOrFail(PatternVersion, quote.patternVersionId);
  return {
    name: `${quote.number} ${quote.title}`,
    paper: quote.number,
    quoteId: quote.id,
    customerId: quote.customerId,
    option: chosen,
    by: day,
    plan,
    definition: definitionOf(version),
    sides: sidesOf(await containerOf(work.em, quote.layoutId)),
  };
}

function requireOption(quote: Quote, option: string | null, field: string): void {
  if (option === null) return;
  const { options } = numbersOfQuote(quote);
  if (options.some(({ name }) => name === option)) return;
  const message = `${quote.number} offers no option "${option}". Choose one that it offers.`;
  throw invalid([{ field, message }]);
}

async function planPattern(
  work: Work,
  laid: LaidPattern & { kinds: Kinds },
  { quantity, option = null, by }: AskedRun,
  field: string,
): Promise<PlannedRun> {
  const day = by ?? addWorkdays(work.today, 10);
  requireReachable(work, day, within(field, 'by'));
  const { definition, worked, kinds } = laid;
  const { layout } = worked;
  const options = option === null ? [] : [{ name: option, typedExtra: null }];
  const terms = quoteTerms.parse({ options });
  const pieces = quantity ?? 1;
  const breaks = [{ quantity: pieces, typedPrice: null, rule: null }];
  const asked = { breaks, tooling: [], overrides: {}, terms };
  const input = await runInputFor(work, { definition, layout, kinds }, asked).catch(
    (error: unknown) => {
      if (!(error instanceof Problem)) throw error;
      throw invalid([{ field: within(field, 'option'), message: error.message }]);
    },
  );
  return {
    name: laid.patternName,
    paper: laid.patternName,
    quoteId: null,
    customerId: null,
    option,
    by: day,
    plan: planOf(input, {
      definition,
      patternId: laid.patternId,
      quantity: pieces,
      option,
    }),
    definition,
    sides: sidesOf(layout.container),
  };
}

const within = (field: string, name: string): string => (field === '' ? name : `${field}.${name}`);

function usualDay({ today }: Work, inHandsOn: string | null): string {
  return inHandsOn !== null && inHandsOn >= today ? inHandsOn : addWorkdays(today, 10);
}

/** The layout itself may be of thousands of pieces. */
async function containerOf(
  em: EntityManager,
  layoutId: number,
): Promise<Layout['container'] | null> {
  const [row] = await em.execute<{ container: string | null }[]>(
    `SELECT json_extract(result, '$.container') AS container FROM layout WHERE id = ?`,
    [layoutId],
  );
  return row?.container ? (JSON.parse(row.container) as Layout['container']) : null;
}

function sidesOf(container: Layout['container'] | null): CutFrom['sides'] {
  if (container === null) return null;
  if (container.form === 'panel') {
    return { widthMm: container.widthMm, heightMm: container.heightMm };
  }
  return container.lengthMm === undefined
    ? null
    : { widthMm: container.lengthMm, heightMm: container.widthMm };
}
