import type { BodyOf, closeClaim as endpoint } from '@hidewright/contract';
import { notFound, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { noteCredit } from './note-credit.ts';
import { SupplierClaim } from './supplier-claim.entity.ts';

/** @throws {Problem} 404 */
export async function findClaim(work: Work, id: number): Promise<SupplierClaim> {
  const claim = await work.em.findOne(SupplierClaim, id);
  if (claim === null) throw notFound('claim');
  return claim;
}

/**
 * Notes what came of a claim. A credit is money, not leather: the lots keep what they cost.
 * @throws {Problem} 409 when it is closed already, 422 when it is credited more than was claimed and nobody says so
 */
export async function closeClaim(
  work: Work,
  claim: SupplierClaim,
  typed: BodyOf<typeof endpoint>,
): Promise<void> {
  if (claim.state !== 'open') throw wrongState(`This claim is ${claim.state} already.`);
  if (typed.state === 'credited') await noteCredit(work, claim, typed, '');
  else giveUp(work, claim, typed.note);
  await logDeed(work, {
    action: typed.state === 'credited' ? 'noted what a claim was credited' : 'gave up a claim',
    subjectKind: 'supplier claim',
    subjectId: claim.id,
    detail: typed,
  });
}

function giveUp({ now }: Work, claim: SupplierClaim, note: string): void {
  claim.state = 'given up';
  claim.closedAt = now.toISOString();
  claim.note = note;
}
