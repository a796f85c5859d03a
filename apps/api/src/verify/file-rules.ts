import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { activityHash } from '../modules/activity/activity-log.ts';
import type { Query, Rule } from './rule.ts';

interface ActivityRow {
  seq: number;
  at: string;
  actor_id: number | null;
  actor_name: string;
  actor_role: string;
  action: string;
  subject_kind: string;
  subject_id: number | null;
  detail: string;
  previous_hash: string;
  hash: string;
}

/** The file itself, the log of who did what, and the files beside the database. */
export const fileRules: Rule[] = [
  {
    says: 'The database file is sound, and every reference leads somewhere',
    find: async ({ query }) => {
      const integrity = await query<{ integrity_check: string }>('PRAGMA integrity_check');
      const dangling = await query<{ table: string; parent: string }>('PRAGMA foreign_key_check');
      return [
        ...integrity.map((row) => row.integrity_check).filter((word) => word !== 'ok'),
        ...dangling.map((row) => `a row of ${row.table} names a ${row.parent} that is not there`),
      ];
    },
  },
  {
    says: 'The log of who did what is whole: no row was changed, left out or put in',
    find: ({ query }) => brokenChain(query),
  },
  {
    says: 'Every kept file is there and has the bytes it had',
    find: async ({ query, dataDir }) => {
      const kept = await query<{ hash: string; name: string }>(
        'SELECT hash, name FROM stored_file',
      );
      const sound = await Promise.all(kept.map((file) => hasItsBytes(dataDir, file.hash)));
      return kept
        .filter((_, index) => sound[index] === false)
        .map((file) => `${file.name} is missing or was changed`);
    },
  },
];

async function brokenChain(query: Query): Promise<string[]> {
  const faults: string[] = [];
  let previous = { seq: 0, hash: '' };
  for (const row of await query<ActivityRow>('SELECT * FROM activity ORDER BY seq')) {
    const whole = {
      seq: row.seq,
      at: row.at,
      actorId: row.actor_id,
      actorName: row.actor_name,
      actorRole: row.actor_role,
      action: row.action,
      subjectKind: row.subject_kind,
      subjectId: row.subject_id,
      detail: JSON.parse(row.detail) as unknown,
      previousHash: row.previous_hash,
    };
    const follows = row.seq === previous.seq + 1 && row.previous_hash === previous.hash;
    if (!follows || activityHash(whole) !== row.hash)
      faults.push(`row ${row.seq} of the log does not fit`);
    previous = row;
  }
  return faults;
}

async function hasItsBytes(dataDir: string, hash: string): Promise<boolean> {
  try {
    const bytes = await readFile(path.join(dataDir, 'files', hash));
    return createHash('sha256').update(bytes).digest('hex') === hash;
  } catch {
    return false;
  }
}
