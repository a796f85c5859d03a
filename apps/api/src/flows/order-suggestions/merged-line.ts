import type { GoodsLineTyped } from '@hidewright/contract';
import {
  countedWords,
  Exact,
  type HardwareUnit,
  isPriceKnown,
  type OfferTerms,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { sayArea } from '../../modules/stock/say-area.ts';
import type { Workshop } from '../../modules/workshop/workshop.entity.ts';
import { boughtLine, type Thing } from './bought-line.ts';

/** A thing of which more is to be bought, on the terms of whoever sells it. */
export interface MoreOf extends Thing {
  name: string;
  unit: 'mm2' | HardwareUnit;
  terms: OfferTerms;
  /** in pieces, or in mm² */
  more: string;
}

interface Merged {
  line: GoodsLineTyped;
  notes: string[];
}

/**
 * More of a thing, with what its draft has already: hardware in what is sold, at the price of both together, or at the
 * one that somebody typed on the draft.
 */
export function mergedLine(
  thing: MoreOf,
  there: GoodsLineTyped | undefined,
  areaUnit: Workshop['areaUnit'],
): Merged {
  const { name, unit, terms, more } = thing;
  const before = quantityOf(there);
  const both = new Exact(before).plus(more);
  const drafted = thing.of === 'hardware' ? inWhatIsSold(both, terms) : both;
  const line = boughtLine(thing, terms, drafted.toFixed());
  const typed =
    there !== undefined && there.unitPrice !== boughtLine(thing, terms, before).unitPrice;
  const say = (quantity: string) =>
    unit === 'mm2' ? sayArea(new Decimal(quantity), areaUnit) : countedWords(quantity, unit);
  const put = typed ? { ...line, unitPrice: there.unitPrice } : line;
  return {
    line: put,
    notes: [
      ...soldNote(name, { terms, asked: both, drafted, say }),
      ...(typed ? [`${name} keeps the price that was typed on its draft.`] : []),
      ...unpricedNote(name, put),
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
  asked: Decimal;
  drafted: Decimal;
  say: (quantity: string) => string;
}

/**
 * Where it is not sold in what was asked for. Sides are only about as large as they are sold, so that an area stays as
 * typed.
 */
function soldNote(name: string, { terms, asked, drafted, say }: Drafted): string[] {
  const { minimum, multiple } = terms;
  const least = minimum !== null && asked.lt(minimum) ? [`at least ${say(minimum)}`] : [];
  // One mm² at a time is any area.
  const inPacks = multiple !== null && new Exact(multiple).gt(1);
  const whole = inPacks && !asked.mod(multiple).isZero() ? [`${say(multiple)} at a time`] : [];
  const sold = [...least, ...whole].join(' and ');
  if (sold === '') return [];
  return [
    drafted.eq(asked)
      ? `${name}: ${say(asked.toFixed())} is drafted, as typed, but it is sold ${sold}.`
      : `${name}: ${say(drafted.toFixed())} is drafted, for it is sold ${sold}.`,
  ];
}

/** Of a line whose price nobody knows: it is drafted all the same. */
const unpricedNote = (name: string, { unitPrice }: GoodsLineTyped): string[] =>
  isPriceKnown(unitPrice)
    ? []
    : [`The price of ${name} is not known: its order asks the supplier for it.`];
