import type { EntityManager } from '@mikro-orm/sqlite';
import { Activity } from '../modules/activity/activity.entity.ts';
import { Problem } from './problem.ts';

/** @throws {Problem} 428 when the version that was read is not named, 400 when it is no version */
export function readIfMatch(header: string | undefined): number {
  if (header === undefined) {
    throw new Problem(
      428,
      'Say which version',
      'Send If-Match with the version you read, so that nobody’s change is lost.',
    );
  }
  const match = /^(?:W\/)?"(\d{1,15})"$/.exec(header.trim());
  if (match?.[1] === undefined) {
    throw new Problem(
      400,
      'Not a version',
      'If-Match must be the ETag of what you read, such as "3".',
    );
  }
  return Number(match[1]);
}

/** @throws {Problem} 412 when somebody changed it meanwhile, with who and what */
export async function requireVersion(
  em: EntityManager,
  subject: { kind: string; id: number; version: number },
  read: number,
): Promise<void> {
  if (subject.version === read) return;
  const last = await em.findOne(
    Activity,
    { subjectKind: subject.kind, subjectId: subject.id },
    { orderBy: { seq: 'desc' } },
  );
  const changed = {
    by: last?.actorName ?? 'somebody',
    at: last?.at ?? '',
    what: last?.action ?? 'changed it',
  };
  throw new Problem(
    412,
    'Changed meanwhile',
    `${changed.by} changed this after you opened it. Look at the new version, then make your change again.`,
    { changed },
  );
}
