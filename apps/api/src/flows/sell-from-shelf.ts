import type { BodyOf, sellFinished } from '@hidewright/contract';
import { lineAmount } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { findFinished, takeFinishedPieces } from '../modules/finished-pieces/finished-ledger.ts';
import type { FinishedPiece } from '../modules/finished-pieces/finished-piece.entity.ts';
import { requireMarkOf } from '../modules/finished-pieces/require-mark.ts';
import { readOneFinished } from '../modules/finished-pieces/read-finished.ts';
import { ShelfSale } from '../modules/finished-pieces/shelf-sale.entity.ts';
import { findDraft } from '../modules/invoices/find-invoice.ts';
import { InvoiceLine } from '../modules/invoices/invoice-line.entity.ts';
import type { Invoice } from '../modules/invoices/invoice.entity.ts';
import { nextVersion } from '../modules/invoices/next-version.ts';
import { startDraft } from '../modules/invoices/start-draft.ts';
import { currencyDigits, sumUp } from '../modules/invoices/sum-up.ts';
import { chosenTaxRate } from '../modules/tax-rates/find-tax-rate.ts';
import type { Work } from '../work.ts';

type Asked = BodyOf<typeof sellFinished>;

/** As many as one change of a draft can name. */
const mostLines = 50;

/**
 * Sells pieces of one kind to a customer: they leave the shelf, and a line of a draft says so. The draft is a new one,
 * or one from the shelf that the customer has already.
 * @throws {Problem} 409 when fewer lie there or the draft cannot take them; 422 for a customer whose mark they do not
 * bear, a rate that cannot be used or a price that comes to nothing
 */
export async function sellFromShelf(
  work: Work,
  { pieceId, ...asked }: Asked & { pieceId: number },
): Promise<Invoice> {
  const piece = await findFinished(work.em, pieceId);
  const customer = await buyerOf(work, piece, asked.customerId);
  const invoice =
    asked.draftId === null
      ? await startDraft(work, { orderId: null, customerId: customer.id })
      : await shelfDraft(work, customer, asked.draftId);
  const line = await addLine(work, invoice, piece, asked);
  const shelfSaleId = await noteSale(work, piece, line);
  await takeFinishedPieces(work, piece, {
    as: 'sold',
    quantity: asked.quantity,
    reason: `sold to ${customer.name}`,
    shelfSaleId,
  });
  await sumUp(work, invoice);
  await nextVersion(work, invoice);
  await logDeed(work, {
    action: `sold ${asked.quantity} of ${line.description} to ${customer.name} from the shelf`,
    subjectKind: 'invoice',
    subjectId: invoice.id,
    detail: { ...asked, finishedPieceId: piece.id },
  });
  return invoice;
}

async function buyerOf({ em }: Work, piece: FinishedPiece, id: number): Promise<Customer> {
  const field = 'customerId';
  const customer = await em.findOne(Customer, id);
  if (customer === null) {
    throw invalid([{ field, message: 'There is no such customer. Choose one of the list.' }]);
  }
  await requireMarkOf(em, piece, id);
  return customer;
}

async function shelfDraft(work: Work, customer: Customer, id: number): Promise<Invoice> {
  const draft = await findDraft(work.em, id);
  const instead = ['draft a new invoice'];
  if (draft.orderId !== null) {
    throw wrongState('That is the draft of an order. Draft a new invoice for these.', instead);
  }
  if (draft.customerId !== customer.id) {
    throw wrongState('That draft is for another customer. Draft a new invoice.', instead);
  }
  return draft;
}

async function addLine(
  work: Work,
  invoice: Invoice,
  piece: FinishedPiece,
  { quantity, unitPrice, taxRateId }: Asked,
): Promise<InvoiceLine> {
  const before = await work.em.count(InvoiceLine, { invoiceId: invoice.id });
  if (before >= mostLines) {
    throw wrongState(`That draft has ${mostLines} lines. Draft a new invoice for these.`, [
      'draft a new invoice',
    ]);
  }
  const rate = await chosenTaxRate(work.em, taxRateId);
  const line = work.em.create(InvoiceLine, {
    invoiceId: invoice.id,
    position: before + 1,
    description: await wordsFor(work, piece),
    quantity,
    unitPrice: new Decimal(unitPrice),
    amount: await amountOf(work, quantity, unitPrice),
    taxRateId: rate?.id ?? null,
    taxPercent: rate?.percent ?? new Decimal(0),
  });
  await work.em.flush();
  return line;
}

async function amountOf(work: Work, quantity: number, unitPrice: string): Promise<Decimal> {
  const amount = new Decimal(lineAmount(quantity, unitPrice, await currencyDigits(work)));
  if (!amount.isZero()) return amount;
  const message = 'At this price they come to nothing. Enter a higher one.';
  throw invalid([{ field: 'unitPrice', message }]);
}

/** "Round coaster, in brass, seconds": whoever buys seconds reads that they are. */
async function wordsFor({ em }: Work, { id }: FinishedPiece): Promise<string> {
  const { patternName, option, sort } = await readOneFinished(em, id);
  return [patternName, option, sort === 'seconds' && 'seconds'].filter(Boolean).join(', ');
}

async function noteSale({ em }: Work, piece: FinishedPiece, line: InvoiceLine): Promise<number> {
  const sale = em.create(ShelfSale, { finishedPieceId: piece.id, invoiceLineId: line.id });
  await em.flush();
  return sale.id;
}
