import { createHash } from 'node:crypto';
import type { Work } from '../../work.ts';
import { Activity } from './activity.entity.ts';

export interface Deed {
  /** What was done, in words that follow a name: "sent quote Q-0241". */
  action: string;
  subjectKind: string;
  subjectId: number | null;
  detail?: Record<string, unknown>;
}

type Covered = Omit<Activity, 'hash'>;

/** Each row's hash covers its own fields and the hash of the row before, so that no row can be changed alone. */
export function activityHash(row: Covered): string {
  const covered = [
    row.seq,
    row.at,
    row.actorId,
    row.actorName,
    row.actorRole,
    row.action,
    row.subjectKind,
    row.subjectId,
    row.detail,
    row.previousHash,
  ];
  return createHash('sha256').update(JSON.stringify(covered)).digest('hex');
}

/** Writes who did what, in the transaction that does it. */
export async function logDeed(work: Work, deed: Deed): Promise<void> {
  const last = await work.em.findOne(Activity, { seq: { $gt: 0 } }, { orderBy: { seq: 'desc' } });
  const row = {
    seq: (last?.seq ?? 0) + 1,
    at: work.now.toISOString(),
    actorId: work.actor.id,
    actorName: work.actor.name,
    actorRole: work.actor.role,
    action: deed.action,
    subjectKind: deed.subjectKind,
    subjectId: deed.subjectId,
    detail: deed.detail ?? {},
    previousHash: last?.hash ?? '',
  };
  work.em.create(Activity, { ...row, hash: activityHash(row) });
  await work.em.flush();
}
