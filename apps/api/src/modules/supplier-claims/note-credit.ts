import { Decimal } from 'decimal.js';
import type { BodyOf, correctCredit as correctEndpoint } from '@hidewright/contract';
import { moneyText } from '../../http/decimal-text.ts';
import { invalid, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { ClaimCredit } from './claim-credit.entity.ts';
import type { SupplierClaim } from './supplier-claim.entity.ts';

interface Credited {
  credited: string;
  /** Said by whoever notes it: without it, more than was claimed is taken for a slip. */
  moreThanClaimed: boolean;
}

/**
 * Writes down what a claim was credited, now and for good; `reason` says why an earlier note was wrong. The claim
 * stands open again where nothing was credited.
 * @throws {Problem} 422 when it is more than was claimed and nobody says so
 */
export async function noteCredit(
  work: Work,
  claim: SupplierClaim,
  { credited, moreThanClaimed }: Credited,
  reason: string,
): Promise<void> {
  const amount = new Decimal(credited);
  if (amount.greaterThan(claim.worth) && !moreThanClaimed) throw aboveClaim(claim);
  const { id: actorId, name: actorName } = work.actor;
  const at = work.now.toISOString();
  const noted = { credited: amount, reason, at, actorId, actorName };
  work.em.create(ClaimCredit, { ...noted, supplierClaimId: claim.id });
  const none = amount.isZero();
  claim.state = none ? 'open' : 'credited';
  claim.credited = none ? null : amount;
  claim.closedAt = none ? null : at;
  await work.em.flush();
}

function aboveClaim({ worth }: SupplierClaim) {
  const message = `${moneyText(worth)} was claimed. Check the amount; if they did credit more, say so below.`;
  return invalid([{ field: 'credited', message }]);
}

/**
 * Puts right what was noted of a claim; what was noted before stays written.
 * @throws {Problem} 409 when nothing was noted, 422 when it is more than was claimed and nobody says so
 */
export async function correctCredit(
  work: Work,
  claim: SupplierClaim,
  { reason, ...typed }: BodyOf<typeof correctEndpoint>,
): Promise<void> {
  if (claim.credited === null)
    throw wrongState(`This claim is ${claim.state}: no credit is noted that could be put right.`);
  const from = moneyText(claim.credited);
  await noteCredit(work, claim, typed, reason);
  await logDeed(work, {
    action: 'put right what a claim was credited',
    subjectKind: 'supplier claim',
    subjectId: claim.id,
    detail: { from, to: typed.credited, reason },
  });
}
