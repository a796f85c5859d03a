import type { CountLine } from '@hidewright/contract';
import { readWhole, unclearComma } from '../../lib/comma.ts';
import { areaText, countText } from '../../lib/formatting.ts';
import { areaExamples, areaFigure, areaUnits, readArea, type AreaUnit } from '../../lib/units.ts';
import type { Entry } from './entry-outbox.ts';

type Counted = Pick<CountLine, 'lotId' | 'countedAreaMm2' | 'countedQuantity' | 'unmeasured'>;

/** What stands in the field of a line: the figure as it is typed, in the shop's unit. */
export function figureOf(line: Counted, unit: AreaUnit): string {
  if (line.countedAreaMm2 !== null) return areaFigure(line.countedAreaMm2, unit, 4);
  return line.countedQuantity === null ? '' : String(line.countedQuantity);
}

/** The most that the contract takes. */
const mostCounted = 10_000_000;

/** What was typed as an entry; a sentence where it is none. */
export function readEntry(text: string, ofLot: boolean, unit: AreaUnit): Entry | string {
  const typed = text.trim();
  if (typed === '') return {};
  if (ofLot) {
    const areaMm2 = readArea(typed, unit);
    return areaMm2 === undefined
      ? (unclearComma(typed) ??
          `Enter the area in ${areaUnits[unit].sign}, such as ${areaExamples[unit]}; 0 when it is gone.`)
      : { areaMm2 };
  }
  const plain = readWhole(typed);
  if (plain === undefined)
    return 'Enter how many there are, as a whole number; 0 when there are none.';
  const quantity = Number(plain);
  return quantity <= mostCounted
    ? { quantity }
    : `That is too many: enter at most ${countText(mostCounted)}.`;
}

/** Whether what was typed so far may be the beginning of a figure. */
export function mayBecomeEntry(text: string, ofLot: boolean, unit: AreaUnit): boolean {
  return ['', '1', '5', '/4', '3/4', '0', '00', '000'].some(
    (rest) => typeof readEntry(text + rest, ofLot, unit) !== 'string',
  );
}

/** What was counted, in words. */
export function countedText(line: Counted, unit: AreaUnit): string {
  if (line.unmeasured) return 'hangs there, not measured';
  return quantityText(line.countedAreaMm2, line.countedQuantity, unit) ?? 'not counted';
}

/** "2 lots, 1 bin": what there is to count at a place. */
export function whatLies(lots: number, bins: number): string {
  const parts = [
    lots > 0 && (lots === 1 ? '1 lot' : `${lots} lots`),
    bins > 0 && (bins === 1 ? '1 bin' : `${bins} bins`),
  ];
  return parts.filter(Boolean).join(', ');
}

/** What came or went since it was counted: "100 gone since". */
export function movedText(
  { movedAreaMm2, movedQuantity }: Pick<CountLine, 'movedAreaMm2' | 'movedQuantity'>,
  unit: AreaUnit,
): string | undefined {
  const gone = Number(movedAreaMm2 ?? movedQuantity ?? 0) < 0;
  const amount = quantityText(
    movedAreaMm2?.replace('-', ''),
    typeof movedQuantity === 'number' ? Math.abs(movedQuantity) : null,
    unit,
  );
  return amount === undefined ? undefined : `${amount} ${gone ? 'gone' : 'come'} since`;
}

/** "1 difference of −2.40 USD goes": what approving posts. */
export function differencesGo(count: number, worth: string): string {
  return count === 1 ? `1 difference of ${worth} goes` : `${count} differences of ${worth} go`;
}

export function quantityText(
  areaMm2: string | null | undefined,
  quantity: number | null | undefined,
  unit: AreaUnit,
): string | undefined {
  if (typeof areaMm2 === 'string') return areaText(areaMm2, unit);
  return typeof quantity === 'number' ? countText(quantity) : undefined;
}
