import { isDeepStrictEqual } from 'node:util';
import { priceRun, type RunInput } from '@hidewright/domain';
import { none, type Rule } from './rule.ts';

interface QuoteRow {
  id: number;
  number: string;
  revision: number;
  input: string;
  numbers: string;
}

interface BreakRow {
  quoteId: number;
  quantity: number;
  priceEach: number;
  total: number;
}

export const quoteRules: Rule[] = [
  {
    says: 'Every quote’s numbers follow from what it was priced from',
    find: async ({ query }) => {
      const quotes = await query<QuoteRow>(
        'SELECT id, number, revision, input, numbers FROM quote',
      );
      return quotes
        .filter((quote) => !followFromInput(quote))
        .map((quote) => `${nameOf(quote)} would price differently`);
    },
  },
  {
    says: 'Every rung of a quote has the price that its numbers say',
    find: async ({ query }) => {
      const quotes = await query<QuoteRow>(
        'SELECT id, number, revision, input, numbers FROM quote',
      );
      const rungs = await query<BreakRow>(
        'SELECT quote_id AS quoteId, quantity, price_each AS priceEach, total FROM quote_break ORDER BY quantity',
      );
      return quotes
        .filter((quote) => !hasItsRungs(quote, rungs))
        .map((quote) => `${nameOf(quote)} has other rungs than its numbers`);
    },
  },
  none(
    'An order was taken on at what its quote offered',
    `SELECT o.number || ' differs from its quote' AS fault FROM customer_order o
      LEFT JOIN quote q ON q.id = o.quote_id LEFT JOIN quote_break b ON b.quote_id = o.quote_id AND b.quantity = o.quantity
    WHERE b.id IS NULL OR o.option_name IS NOT q.agreed_option
      OR (o.option_name IS NULL AND (b.price_each <> o.price_each OR b.total <> o.total)) OR q.agreed_quantity IS NOT o.quantity
      OR q.customer_id <> o.customer_id`,
  ),
  none(
    'A pattern’s versions are counted without a gap',
    `SELECT p.name || ' says ' || p.latest_version || ' versions and has ' || COUNT(v.id) AS fault
    FROM pattern p LEFT JOIN pattern_version v ON v.pattern_id = p.id GROUP BY p.id
    HAVING COUNT(v.id) <> p.latest_version OR MAX(v.number) IS NOT p.latest_version`,
  ),
  none(
    'A layout’s pieces are those that it draws',
    `SELECT 'layout ' || id || ' says ' || pieces || ' pieces' AS fault FROM layout
    WHERE json_extract(result, '$.pieces') <> pieces
      OR (json_extract(result, '$.by') <> 'hand count' AND json_array_length(result, '$.placements') <> pieces)`,
  ),
];

const nameOf = (quote: QuoteRow) => `${quote.number}, revision ${quote.revision},`;

function followFromInput(quote: QuoteRow): boolean {
  const again = priceRun(JSON.parse(quote.input) as RunInput);
  return holds(JSON.parse(JSON.stringify(again)), JSON.parse(quote.numbers));
}

/** All that was kept is still so; numbers kept by an earlier release know less than they would today. */
function holds(again: unknown, kept: unknown): boolean {
  if (Array.isArray(kept)) {
    return (
      Array.isArray(again) &&
      again.length === kept.length &&
      kept.every((each, at) => holds(again[at], each))
    );
  }
  if (typeof kept !== 'object' || kept === null) return again === kept;
  if (typeof again !== 'object' || again === null) return false;
  return Object.entries(kept).every(([key, value]) =>
    holds((again as Record<string, unknown>)[key], value),
  );
}

function hasItsRungs(quote: QuoteRow, all: BreakRow[]): boolean {
  const { breaks } = JSON.parse(quote.numbers) as ReturnType<typeof priceRun>;
  const said = breaks.map((rung) => [
    rung.quantity,
    Math.round(Number(rung.priceEach) * 10_000),
    Math.round(Number(rung.total) * 100),
  ]);
  const kept = all
    .filter((rung) => rung.quoteId === quote.id)
    .map((rung) => [rung.quantity, rung.priceEach, rung.total]);
  return isDeepStrictEqual(said.sort(byQuantity), kept.sort(byQuantity));
}

const byQuantity = (a: number[], b: number[]) => (a[0] ?? 0) - (b[0] ?? 0);
