import { priceRun, type BreakNumbers, type RunInput, type RunNumbers } from '@hidewright/domain';
import type { QuoteBody } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { invalid } from '../http/problem.ts';
import { definitionFor } from '../modules/designs/read-designs.ts';
import { keepLayoutId } from '../modules/layouts/stored-layouts.ts';
import { QuoteBreak } from '../modules/quotes/quote-break.entity.ts';
import type { Quote } from '../modules/quotes/quote.entity.ts';
import type { Work } from '../work.ts';
import type { LaidPattern } from './lay-pattern.ts';
import { runInputFor } from './run-input.ts';

/** All of a draft that follows from what was typed. */
type WorkedOut = Pick<
  Quote,
  | 'customerId'
  | 'patternVersionId'
  | 'layoutId'
  | 'title'
  | 'inHandsOn'
  | 'overrides'
  | 'message'
  | 'terms'
> & { input: RunInput; numbers: RunNumbers };

/**
 * Prices a quote from what was typed, the pattern and the shop's values of today, and keeps its layout.
 * @throws {Problem} 422 when the customer does not exist, or the day in hands is over
 * @throws {InvalidInput | NotWorkable} when the run cannot be priced
 */
export async function workOutQuote(
  work: Work,
  asked: QuoteBody,
  laid: LaidPattern,
): Promise<WorkedOut> {
  await requireCustomer(work, asked.customerId);
  requireToCome(work, asked.inHandsOn);
  const layoutId = await keepLayoutId(work, laid.worked);
  const { definition } = await definitionFor(work.em, laid.definition, {
    patternId: laid.patternId,
    customerId: asked.customerId,
  });
  const input = await runInputFor(work, { definition, layout: laid.worked.layout }, asked);
  return {
    customerId: asked.customerId,
    patternVersionId: laid.versionId,
    layoutId,
    title: asked.title || laid.patternName,
    inHandsOn: asked.inHandsOn,
    overrides: setByHand(asked.overrides),
    message: asked.message,
    terms: asked.terms,
    input,
    numbers: priceRun(input),
  };
}

/** The rungs as rows of their own, where they can be looked up and agreed to; written with the next flush. */
export function keepRungs(
  { em }: Pick<Work, 'em'>,
  quoteId: number,
  { input, numbers }: Pick<WorkedOut, 'input' | 'numbers'>,
): void {
  for (const rung of numbers.breaks) {
    const typed = input.breaks.find((each) => each.quantity === rung.quantity)?.typedPrice ?? null;
    em.create(QuoteBreak, rungRow(quoteId, rung, typed));
  }
}

const rungRow = (quoteId: number, rung: BreakNumbers, typed: string | null) => ({
  quoteId,
  quantity: rung.quantity,
  typedPrice: typed === null ? null : new Decimal(typed),
  priceEach: new Decimal(rung.priceEach),
  total: new Decimal(rung.total),
});

async function requireCustomer({ em }: Work, id: number): Promise<void> {
  const there = await em.execute('SELECT id FROM customer WHERE id = ?', [id]);
  if (there.length > 0) return;
  throw invalid([
    { field: 'customerId', message: 'Choose a customer from the list, or add a new one.' },
  ]);
}

function requireToCome(work: Work, inHandsOn: string | null): void {
  if (inHandsOn === null || inHandsOn >= work.today) return;
  throw invalid([
    { field: 'inHandsOn', message: 'That day is over. Choose a day to come, or leave it empty.' },
  ]);
}

function setByHand({
  rejectPercent,
  leatherPricePerFt2,
}: QuoteBody['overrides']): Quote['overrides'] {
  return {
    ...(rejectPercent !== undefined && { rejectPercent }),
    ...(leatherPricePerFt2 !== undefined && { leatherPricePerFt2 }),
  };
}
