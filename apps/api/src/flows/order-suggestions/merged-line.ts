import type { GoodsLineTyped } from '@hidewright/contract';
import { countedWords, Exact, type HardwareUnit, type OfferTerms } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { sayArea } from '../../modules/stock/say-area.ts';
import type { Workshop } from '../../modules/workshop/workshop.entity.ts';
import { boughtLine } from './bought-line.ts';
import type { Suggested } from './suggest-orders.ts';

export interface Merged {
  line: GoodsLineTyped;
  notes: string[];
}

/**
 * More of a thing, with what its draft has already: hardware in what is sold, at the price of both together, or at the
 * one that somebody typed on the draft.
 */
export function mergedLine(
  { row, sold: { terms } }: Suggested,
  { there, more }: { there: GoodsLineTyped | undefined; more: string },
  { areaUnit }: Workshop,
): Merged {
  const before = quantityOf(there);
  const both = new Exact(before).plus(more);
  const drafted = row.of === 'hardware' ? inWhatIsSold(both, terms) : both;
  const line = boughtLine(row, terms, drafted.toFixed());
  const typed = there !== undefined && there.unitPrice !== boughtLine(row, terms, before).unitPrice;
  const say = (quantity: string) =>
    row.of === 'hardware'
      ? countedWords(quantity, row.unit as HardwareUnit)
      : sayArea(new Decimal(quantity), areaUnit);
  return {
    line: typed ? { ...line, unitPrice: there.unitPrice } : line,
    notes: [
      ...(drafted.eq(both)
        ? soldNote(row.name, { terms, drafted: both, say })
        : [`${row.name}: ${say(drafted.toFixed())} are drafted, as less is not sold.`]),
      ...(typed ? [`${row.name} keeps the price that was typed on its draft.`] : []),
    ],
  };
}

const quantityOf = (line: GoodsLineTyped | undefined): string => {
  if (line === undefined) return '0';
  return line.of === 'leather' ? line.areaMm2 : String(line.quantity);
};

function inWhatIsSold(quantity: Decimal, { minimum, multiple }: OfferTerms): Decimal {
  const least = Exact.max(quantity, minimum ?? '0');
  const pack = multiple ?? '1';
  return least.div(pack).ceil().times(pack);
}

interface Drafted {
  terms: OfferTerms;
  drafted: Decimal;
  say: (quantity: string) => string;
}

/** Sides are only about as large as they are sold, so that an area stays as typed. */
function soldNote(name: string, { terms, drafted, say }: Drafted): string[] {
  const { minimum, multiple } = terms;
  const least = minimum !== null && drafted.lt(minimum) ? [`at least ${say(minimum)}`] : [];
  const whole =
    multiple !== null && !drafted.mod(multiple).isZero() ? [`${say(multiple)} at a time`] : [];
  const sold = [...least, ...whole];
  if (sold.length === 0) return [];
  return [
    `${name}: ${say(drafted.toFixed())} is drafted, as typed, but it is sold ${sold.join(' and ')}.`,
  ];
}
