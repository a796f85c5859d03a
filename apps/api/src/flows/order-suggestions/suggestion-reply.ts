import type { OrderSuggestionReply } from '@hidewright/contract';
import { addDays, countWords, unitWord } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { priceText } from '../../http/decimal-text.ts';
import { kitCounts } from '../../modules/hardware/kit-counts.ts';
import { sayRackArea } from '../../modules/stock/say-area.ts';
import type { Suggested, Suggestions } from './suggest-orders.ts';
import { whyWords, type Say } from './why-words.ts';

type Around = Pick<Suggestions, 'workshop' | 'today'>;

/** Figures travel to a thousandth at most: stock has no more, and statistics need none. */
const text = (figure: number): string => new Decimal(figure).toDecimalPlaces(3).toFixed();
const textOrNull = (figure: number | null | undefined): string | null =>
  figure === null || figure === undefined ? null : text(figure);

export function suggestionReply(item: Suggested, around: Around): OrderSuggestionReply {
  const { row, suggestion, coming } = item;
  const { today } = around;
  const { dueInDays } = suggestion;
  const dueOn = dueInDays === null ? null : addDays(today, Math.min(dueInDays, 3650));
  return {
    ...{ of: row.of, id: row.id, name: row.name, kind: row.kind, unit: row.unit },
    kits: item.kits.map(({ id, name, parts }) => ({ id, name, free: kitCounts(parts).free })),
    state: suggestion.state,
    why: whyWords(item, sayerOf(item, around), dueOn),
    ...amountsOf(item),
    ...orderOf(item),
    ...supplierOf(item),
    dueOn: suggestion.state === 'now' ? today : dueOn,
    runsOutOn: coming.runsOutOn,
    belowMinimumOn: coming.belowMinimumOn,
    days: coming.days.map(({ day, what, comes, goes, left }) => ({
      ...{ day, what },
      ...{ comes: text(comes), goes: text(goes), left: text(left) },
    })),
    ...statisticsOf(item),
    version: row.version,
  };
}

function sayerOf({ row }: Suggested, { workshop }: Around): Say {
  const { unit } = row;
  if (unit === 'mm2') return (areaMm2) => sayRackArea(new Decimal(areaMm2), workshop);
  return (count) => {
    // Below ten a rate such as 2.5 a week would lose its sense.
    const rounded = new Decimal(count).toDecimalPlaces(count < 10 ? 1 : 0).toFixed();
    return `${countWords(rounded)}${unit === 'piece' ? '' : ` ${unitWord(unit, rounded)}`}`;
  };
}

function amountsOf({ amounts, open, suggestion }: Suggested) {
  return {
    onHand: text(amounts.onHand),
    reserved: text(amounts.reserved),
    free: text(amounts.free),
    promised: text(amounts.promised),
    onOrder: text(amounts.onOrder),
    drafted: text(amounts.drafted),
    drafts: open.drafts,
    overdue: open.overdue,
    minimum: text(amounts.minimum),
    position: text(suggestion.position),
    point: text(suggestion.point),
  };
}

function orderOf({ row, sold, suggestion }: Suggested) {
  const { pointBy, quantity, usual, usualBy, usualPrice, usualCost, economic } = suggestion;
  return {
    ...{ pointBy, quantity, usual, usualBy },
    whole:
      row.whole_form === null || row.whole_area === null
        ? null
        : { areaMm2: text(row.whole_area / 1000), form: row.whole_form },
    least: sold.terms.minimum,
    multiple: sold.terms.multiple,
    economic: textOrNull(economic),
    unitPrice: priceText(new Decimal(usualPrice)),
    amount: usualCost,
  };
}

function supplierOf({ sold: { supplier, arrivesOn } }: Suggested) {
  return {
    supplierId: supplier?.id ?? null,
    supplierName: supplier?.name ?? null,
    arrivesOn,
  };
}

function statisticsOf({ use, sold, suggestion, row }: Suggested) {
  const { lead } = sold;
  const { workedOut } = suggestion;
  const kept = row.of === 'leather' ? 1000 : 1;
  return {
    usage: {
      periodDays: use.periodDays,
      series: use.series.map(text),
      mean: text(use.mean),
      sd: text(use.sd),
      idlePercent: text(use.idleShare * 100),
      method: use.method,
      forecast: text(use.forecast),
      size: textOrNull(use.croston?.size),
      interval: textOrNull(use.croston?.interval),
    },
    lead: {
      meanDays: text(lead.meanDays),
      sdDays: text(lead.sdDays),
      deliveries: lead.deliveries,
    },
    workedOut:
      workedOut === null ? null : { safety: text(workedOut.safety), point: text(workedOut.point) },
    byHand: {
      point: row.order_point === null ? null : text(row.order_point / kept),
      quantity: row.order_quantity === null ? null : text(row.order_quantity / kept),
    },
  };
}
