import { Decimal } from 'decimal.js';
import { costOfOldest } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { scaled, unscaled } from '../../db/columns/scaled-decimal.ts';
import { notFound, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { FinishedMovement } from './finished-movement.entity.ts';
import { FinishedPiece } from './finished-piece.entity.ts';

/*
 * The one place that moves finished pieces: the row in the ledger and what is left of them change together. They
 * leave at the average of what those on the shelf cost, and the last one takes the last cent with it.
 */

export type FinishedKind = Pick<FinishedPiece, 'patternId' | 'optionName' | 'sort' | 'customerId'>;

/** @throws {Problem} 404 */
export async function findFinished(em: EntityManager, id: number): Promise<FinishedPiece> {
  const piece = await em.findOne(FinishedPiece, id);
  if (piece === null) throw notFound('kind of finished piece');
  return piece;
}

/** Lays pieces that a job made beside those of their kind. */
export async function putFinished(
  work: Work,
  kind: FinishedKind,
  made: { quantity: number; value: Decimal; jobId: number; reason: string },
): Promise<FinishedPiece> {
  const piece = await pieceOf(work, kind);
  await move(work, piece, { kind: 'made', ...made });
  return piece;
}

/** Lays pieces that no job put there beside those of their kind; a count, as of what is found. */
export async function putFoundFinished(
  work: Work,
  kind: FinishedKind,
  found: { quantity: number; unitCost: Decimal | null; reason: string },
): Promise<FinishedPiece> {
  const { quantity, unitCost, reason } = found;
  const piece = await pieceOf(work, kind);
  const value = unitCost?.times(quantity) ?? (await costOfFound(work, piece, quantity));
  await move(work, piece, { kind: 'count', quantity, value, jobId: null, reason });
  return piece;
}

async function pieceOf({ em }: Work, kind: FinishedKind): Promise<FinishedPiece> {
  const nothing = { onHand: 0, value: new Decimal(0), place: '' };
  const piece =
    (await em.findOne(FinishedPiece, { ...kind })) ??
    em.create(FinishedPiece, { ...kind, ...nothing });
  await em.flush();
  return piece;
}

interface Taken {
  as: 'sold' | 'given' | 'spoiled';
  quantity: number;
  reason: string;
  /** The line of an invoice that they leave for, where one is written. */
  shelfSaleId?: number;
}

/** @throws {Problem} 409 when fewer lie there */
export async function takeFinishedPieces(
  work: Work,
  piece: FinishedPiece,
  { as, quantity, reason, shelfSaleId }: Taken,
): Promise<void> {
  const { onHand } = piece;
  if (quantity > onHand) {
    const there = onHand === 1 ? '1 of them is' : `${onHand} of them are`;
    throw wrongState(
      `${onHand === 0 ? 'None of them is' : there} on the shelf, and ${quantity} cannot be taken. Take fewer, or count the shelf first.`,
      onHand > 0 ? [`take up to ${onHand}`] : [],
    );
  }
  const value = costOf(piece, quantity).negated();
  await move(
    work,
    piece,
    { kind: as, quantity: -quantity, value, jobId: null, reason },
    shelfSaleId,
  );
}

/** Lays what a sale took where it lay, at the very value that it left with. */
export async function putBackFinished(
  work: Work,
  shelfSaleId: number,
  reason: string,
): Promise<void> {
  const taken = await work.em.findOneOrFail(FinishedMovement, { shelfSaleId, kind: 'sold' });
  const piece = await findFinished(work.em, taken.finishedPieceId);
  const back = { quantity: -taken.quantity, value: taken.value.negated() };
  await move(work, piece, { kind: 'put back', ...back, jobId: null, reason }, shelfSaleId);
}

/** Sets what is there to what was counted; a count that agrees moves nothing. */
export async function countFinishedPieces(
  work: Work,
  piece: FinishedPiece,
  { counted, reason }: { counted: number; reason: string },
): Promise<void> {
  const quantity = counted - piece.onHand;
  if (quantity === 0) return;
  const value =
    quantity < 0 ? costOf(piece, -quantity).negated() : await costOfFound(work, piece, quantity);
  await move(work, piece, { kind: 'count', quantity, value, jobId: null, reason });
}

const costOf = ({ onHand, value }: FinishedPiece, quantity: number): Decimal =>
  unscaled(costOfOldest([{ quantity: onHand, value: scaled(value, 2) }], quantity), 2);

/** Pieces that were found cost what those beside them do, or, where none lies there, what the last that came did. */
async function costOfFound({ em }: Work, piece: FinishedPiece, quantity: number): Promise<Decimal> {
  const last = { finishedPieceId: piece.id, quantity: { $gt: 0 } };
  const like =
    piece.onHand > 0
      ? { quantity: piece.onHand, value: piece.value }
      : await em.findOne(FinishedMovement, last, { orderBy: { id: 'desc' } });
  if (like === null) return new Decimal(0);
  return like.value.times(quantity).dividedBy(like.quantity).toDecimalPlaces(2);
}

async function move(
  work: Work,
  piece: FinishedPiece,
  moved: Pick<FinishedMovement, 'kind' | 'quantity' | 'value' | 'jobId' | 'reason'>,
  shelfSaleId: number | null = null,
): Promise<void> {
  piece.onHand += moved.quantity;
  piece.value = piece.value.plus(moved.value);
  work.em.create(FinishedMovement, {
    ...moved,
    shelfSaleId,
    finishedPieceId: piece.id,
    at: work.now.toISOString(),
    day: work.today,
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  await work.em.flush();
}
