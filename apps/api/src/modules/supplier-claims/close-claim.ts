import { Decimal } from 'decimal.js';
import type { BodyOf, closeClaim as endpoint } from '@hidewright/contract';
import { notFound, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { SupplierClaim } from './supplier-claim.entity.ts';

/** @throws {Problem} 404 */
export async function findClaim(work: Work, id: number): Promise<SupplierClaim> {
  const claim = await work.em.findOne(SupplierClaim, id);
  if (claim === null) throw notFound('claim');
  return claim;
}

/**
 * Notes what came of a claim. A credit is money, not leather: the lots keep what they cost.
 * @throws {Problem} 409 when it is closed already
 */
export async function closeClaim(
  work: Work,
  claim: SupplierClaim,
  typed: BodyOf<typeof endpoint>,
): Promise<void> {
  if (claim.state !== 'open') throw wrongState(`This claim is ${claim.state} already.`);
  claim.state = typed.state;
  claim.closedAt = work.now.toISOString();
  if (typed.state === 'credited') claim.credited = new Decimal(typed.credited);
  else claim.note = typed.note;
  await work.em.flush();
  await logDeed(work, {
    action: typed.state === 'credited' ? 'noted what a claim was credited' : 'gave up a claim',
    subjectKind: 'supplier claim',
    subjectId: claim.id,
    detail: typed,
  });
}
