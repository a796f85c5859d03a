import { createHash } from 'node:crypto';
import type { Work } from '../../work.ts';
import type { Activity } from './activity.entity.ts';

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

/**
 * Writes who did what, in the transaction that does it; what that has changed so far is written with it. In plain SQL,
 * since every change does this.
 */
export async function logDeed({ em, now, actor }: Work, deed: Deed): Promise<void> {
  await em.flush();
  const [last] = await em.execute<Pick<Activity, 'seq' | 'hash'>[]>(
    'SELECT seq, hash FROM activity ORDER BY seq DESC LIMIT 1',
  );
  const row = {
    seq: (last?.seq ?? 0) + 1,
    at: now.toISOString(),
    actorId: actor.id,
    actorName: actor.name,
    actorRole: actor.role,
    action: deed.action,
    subjectKind: deed.subjectKind,
    subjectId: deed.subjectId,
    detail: deed.detail ?? {},
    previousHash: last?.hash ?? '',
  };
  const { detail, ...plain } = row;
  await em.execute(
    `INSERT INTO activity (seq, at, actor_id, actor_name, actor_role, action, subject_kind, subject_id, previous_hash,
      detail, hash) VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)`,
    [...Object.values(plain), JSON.stringify(detail), activityHash(row)],
    'run',
  );
}
