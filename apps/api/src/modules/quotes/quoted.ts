import { sumMoney, type RunInput } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import { QuoteBreak } from './quote-break.entity.ts';
import type { Quote } from './quote.entity.ts';

/** What a quote offers, at what price: all that its customer gets to see of its numbers. */
export interface Quoted {
  breaks: {
    quantity: number;
    typedPrice: string | null;
    priceEach: string;
    goodsTotal: string;
    total: string;
  }[];
  tooling: { name: string; charge: string }[];
  toolingTotal: string;
}

export async function quotedOf(
  work: Pick<Work, 'em'>,
  quote: Pick<Quote, 'id' | 'input'>,
): Promise<Quoted> {
  const rungs = await work.em.find(
    QuoteBreak,
    { quoteId: quote.id },
    { orderBy: { quantity: 'asc' } },
  );
  const input = quote.input as RunInput;
  const toolingTotal = sumMoney(
    input.tooling.map((tool) => tool.charge),
    2,
  );
  return {
    breaks: rungs.map((rung) => ({
      quantity: rung.quantity,
      typedPrice: rung.typedPrice === null ? null : priceText(rung.typedPrice),
      priceEach: priceText(rung.priceEach),
      goodsTotal: moneyText(rung.total.minus(toolingTotal)),
      total: moneyText(rung.total),
    })),
    tooling: input.tooling.map(({ name, charge }) => ({
      name,
      charge: moneyText(new Decimal(charge)),
    })),
    toolingTotal,
  };
}
