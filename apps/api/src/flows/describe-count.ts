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
import { readReservationsOf } from '../modules/stock/read-ledger.ts';
import { itemOf } from '../modules/stock/stock-item.ts';
import { costsOfChanges } from '../modules/stock/stock-value.ts';
import type { Work } from '../work.ts';

/** A sheet as it stands. While it is counted, nobody is told what the books say. */
export async function describeCount(work: Work, id: number): Promise<CountReply> {
  const sheet = await findCount(work.em, id);
  const [card] = await readCountCards(work.em, { id, limit: 1 });
  if (card === undefined) throw notFound('count sheet');
  const rows = await readSheetLines(work.em, id);
  const lines = await toReplies(work, sheet, rows);
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
  const [line] = await toReplies(work, sheet, [row]);
  if (line === undefined) throw notFound('line on this sheet');
  return line;
}

const sumOf = (lines: readonly CountLine[]): string =>
  moneyText(lines.reduce((sum, line) => sum.plus(line.differenceValue ?? '0'), new Decimal(0)));

const areaOf = (row: SheetLine, quantity: number | null): string | null =>
  row.lotId === null || quantity === null ? null : unscaled(quantity, 3).toFixed();

const countOf = (row: SheetLine, quantity: number | null): number | null =>
  row.lotId === null ? quantity : null;

const shownOf = (sheet: StockCount, { book }: SheetLine): number | null =>
  sheet.state === 'open' ? null : book;

function differenceOf(sheet: StockCount, row: SheetLine): number | null {
  const { counted, onHand, reserved } = row;
  const bookThen = shownOf(sheet, row);
  return counted === null || bookThen === null
    ? null
    : countOutcome({ counted, bookThen, onHandNow: onHand, reserved }).difference;
}

/** What came or went since it was counted, as long as that is still to be judged. */
function movedOf(sheet: StockCount, { book, onHand }: SheetLine): number | null {
  if (sheet.state !== 'handed in' || book === null || book === onHand) return null;
  return onHand - book;
}

async function toReplies(
  work: Work,
  sheet: StockCount,
  rows: readonly SheetLine[],
): Promise<CountLine[]> {
  const valueOf = await valuesOf(work, sheet, rows);
  return rows.map((row) => toReply(sheet, row, valueOf(row)));
}

function toReply(sheet: StockCount, row: SheetLine, value: string | null): CountLine {
  const { counted, book: _, onHand: __, reserved: ___, posted: ____, ...said } = row;
  const shown = shownOf(sheet, row);
  const difference = differenceOf(sheet, row);
  const moved = movedOf(sheet, row);
  return {
    ...said,
    countedAreaMm2: areaOf(row, counted),
    countedQuantity: countOf(row, counted),
    bookAreaMm2: areaOf(row, shown),
    bookQuantity: countOf(row, shown),
    differenceAreaMm2: areaOf(row, difference),
    differenceQuantity: countOf(row, difference),
    differenceValue: value,
    movedAreaMm2: areaOf(row, moved),
    movedQuantity: countOf(row, moved),
  };
}

/** What the differences are worth at cost: as posted, or as they would be posted now. */
async function valuesOf(
  work: Work,
  sheet: StockCount,
  rows: readonly SheetLine[],
): Promise<(row: SheetLine) => string | null> {
  const changeOf = (row: SheetLine) =>
    sheet.state === 'approved' ? 0 : (differenceOf(sheet, row) ?? 0);
  const costOf = await costsOfChanges(
    work.em,
    rows.map((row) => ({ item: itemOf(row), change: changeOf(row) })),
  );
  return (row) => {
    if (differenceOf(sheet, row) === null) return null;
    if (sheet.state === 'approved') return moneyText(unscaled(row.posted ?? 0, 2));
    return moneyText(costOf(itemOf(row), changeOf(row)));
  };
}

/** What is held for jobs of things of which the sheet leaves less than is held. */
async function wouldBreak(work: Work, rows: readonly SheetLine[]): Promise<CountReply['broken']> {
  const short = rows.filter(({ counted, book, onHand, reserved }) => {
    if (counted === null || book === null) return false;
    const outcome = countOutcome({ counted, bookThen: book, onHandNow: onHand, reserved });
    return outcome.missing > 0;
  });
  return readReservationsOf(work.em, {
    lotIds: short.flatMap(({ lotId }) => lotId ?? []),
    hardwareIds: short.flatMap(({ hardwareId }) => hardwareId ?? []),
  });
}
