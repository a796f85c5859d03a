import { sumMoney, type BreakNumbers, type RunInput } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import type { Quote } from './quote.entity.ts';
import { numbersOfQuote } from './quote-numbers.ts';

interface QuotedRung {
  quantity: number;
  priceEach: string;
  goodsTotal: string;
  charges: { name: string; amount: string }[];
  total: string;
  reorderTotal: string;
}

/** What a quote offers, at what price: all that its customer gets to see of its numbers. */
export interface Quoted {
  breaks: (QuotedRung & { typedPrice: string | null })[];
  options: { name: string; breaks: QuotedRung[] }[];
  tooling: { name: string; charge: string }[];
  toolingTotal: string;
}

export function quotedOf(quote: Pick<Quote, 'input' | 'numbers'>): Quoted {
  const { tooling, breaks: asked } = quote.input as RunInput;
  const numbers = numbersOfQuote(quote);
  const typed = (quantity: number) =>
    asked.find((each) => each.quantity === quantity)?.typedPrice ?? null;
  return {
    breaks: numbers.breaks.map((rung) => ({
      ...quotedRung(rung),
      typedPrice: typed(rung.quantity),
    })),
    options: numbers.options.map(({ name, breaks }) => ({ name, breaks: breaks.map(quotedRung) })),
    tooling: tooling.map(({ name, charge }) => ({ name, charge: moneyText(new Decimal(charge)) })),
    toolingTotal: sumMoney(
      tooling.map((tool) => tool.charge),
      2,
    ),
  };
}

function quotedRung(rung: BreakNumbers): QuotedRung {
  const money = (text: string) => moneyText(new Decimal(text));
  return {
    quantity: rung.quantity,
    priceEach: priceText(new Decimal(rung.priceEach)),
    goodsTotal: money(rung.goodsTotal),
    charges: rung.charges.map(({ name, amount }) => ({ name, amount: money(amount) })),
    total: money(rung.total),
    reorderTotal: money(rung.reorderTotal),
  };
}
