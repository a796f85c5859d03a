import type { CountLine, StockCount as CountReply } from '@hidewright/contract';
import { countOutcome } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import { moneyText } from '../http/decimal-text.ts';
import { notFound } from '../http/problem.ts';
import { readSheetLines, type SheetLine } from '../modules/counts/count-sheet-lines.ts';
import { findCount } from '../modules/counts/find-count.ts';
import { readCountCards } from '../modules/counts/read-counts.ts';
import type { StockCount } from '../modules/counts/stock-count.entity.ts';
import { readReservations } from '../modules/stock/read-ledger.ts';
import { itemOf } from '../modules/stock/stock-item.ts';
import { costOfChange } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';

/** A sheet as it stands. While it is counted, nobody is told what the books say. */
export async function describeCount(work: Work, id: number): Promise<CountReply> {
  const sheet = await findCount(work.em, id);
  const [card] = await readCountCards(work.em, { id, limit: 1 });
  if (card === undefined) throw notFound('count sheet');
  const rows = await readSheetLines(work.em, id);
  const lines: CountLine[] = [];
  for (const row of rows) lines.push(await toReply(work, sheet, row));
  return {
    ...card,
    place: sheet.place,
    lines,
    differenceValue: sheet.state === 'open' ? null : sumOf(lines),
    broken: sheet.state === 'handed in' ? await wouldBreak(work, rows) : [],
  };
}

/** @throws {Problem} 404 */
export async function describeCountLine(
  work: Work,
  countId: number,
  lineId: number,
): Promise<CountLine> {
  const sheet = await findCount(work.em, countId);
  const row = (await readSheetLines(work.em, countId)).find(({ id }) => id === lineId);
  if (row === undefined) throw notFound('line on this sheet');
  return toReply(work, sheet, row);
}

const sumOf = (lines: readonly CountLine[]): string =>
  moneyText(lines.reduce((sum, line) => sum.plus(line.differenceValue ?? '0'), new Decimal(0)));

const areaOf = (row: SheetLine, quantity: number | null): string | null =>
  row.lotId === null || quantity === null ? null : unscaled(quantity, 3).toFixed();

const countOf = (row: SheetLine, quantity: number | null): number | null =>
  row.lotId === null ? quantity : null;

async function toReply(work: Work, sheet: StockCount, row: SheetLine): Promise<CountLine> {
  const { counted, book, onHand, reserved, posted: _, ...said } = row;
  const shown = sheet.state === 'open' ? null : book;
  const difference =
    counted === null || shown === null
      ? null
      : countOutcome({ counted, bookThen: shown, onHandNow: onHand, reserved }).difference;
  return {
    ...said,
    countedAreaMm2: areaOf(row, counted),
    countedQuantity: countOf(row, counted),
    bookAreaMm2: areaOf(row, shown),
    bookQuantity: countOf(row, shown),
    differenceAreaMm2: areaOf(row, difference),
    differenceQuantity: countOf(row, difference),
    differenceValue: await valueOf(work, sheet, row, difference),
    movedSince: sheet.state === 'handed in' && shown !== null && shown !== onHand,
  };
}

/** At cost: as posted, or as it would be posted now. */
async function valueOf(
  work: Work,
  sheet: StockCount,
  row: SheetLine,
  difference: number | null,
): Promise<string | null> {
  if (difference === null) return null;
  if (sheet.state === 'approved') return moneyText(unscaled(row.posted ?? 0, 2));
  return moneyText(await costOfChange(work.em, itemOf(row), difference));
}

/** What is held for jobs of things of which the sheet leaves less than is held. */
async function wouldBreak(work: Work, rows: readonly SheetLine[]): Promise<CountReply['broken']> {
  const broken: NonNullable<CountReply['broken']> = [];
  for (const row of rows) {
    const { counted, book, onHand, reserved, lotId, hardwareId } = row;
    if (counted === null || book === null) continue;
    const outcome = countOutcome({ counted, bookThen: book, onHandNow: onHand, reserved });
    if (outcome.missing === 0) continue;
    const asked = { lotId: lotId ?? undefined, hardwareId: hardwareId ?? undefined, limit: 200 };
    broken.push(...(await readReservations(work.em, asked)));
  }
  return broken;
}
