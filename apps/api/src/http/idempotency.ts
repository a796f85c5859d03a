import { createHash } from 'node:crypto';
import type { Request } from 'express';
import type { Work } from '../work.ts';
import { Problem } from './problem.ts';

/** What makes two requests the same: who asked, for what, with which words. */
export interface RequestKey {
  key: string;
  scope: string;
  requestHash: string;
}

/** @throws {Problem} 400 when the key is no key */
export function readRequestKey(request: Request): RequestKey | undefined {
  const key = request.get('Idempotency-Key');
  if (key === undefined) return undefined;
  if (!/^[\x21-\x7e]{1,200}$/.test(key)) {
    throw new Problem(
      400,
      'Not a key',
      'Idempotency-Key must be 1 to 200 visible characters; a UUID does well.',
    );
  }
  const requestHash = createHash('sha256')
    .update(JSON.stringify(request.body ?? null))
    .digest('hex');
  return {
    key,
    scope: `${request.user?.id ?? 'nobody'} ${request.method} ${request.originalUrl}`,
    requestHash,
  };
}

/**
 * Does the work once for a key: the reply is kept in the transaction that does the work, so that neither can
 * exist without the other. A second request with the key waits for the first one's transaction, then reads it.
 */
export async function once(
  work: Work,
  asked: RequestKey | undefined,
  status: number,
  run: () => Promise<unknown>,
): Promise<{ reply: unknown; replayed: boolean }> {
  if (asked === undefined) return { reply: await run(), replayed: false };
  const earlier = await keptReply(work, asked);
  if (earlier !== undefined) {
    if (earlier.requestHash !== asked.requestHash) {
      throw new Problem(
        422,
        'Key used before',
        'This Idempotency-Key was used for another request. Send a new key.',
      );
    }
    return { reply: earlier.reply, replayed: true };
  }
  const reply = await run();
  await keepReply(work, asked, status, reply);
  return { reply, replayed: false };
}

/** Every creating request asks for it: in plain SQL, which is quicker than an entity. */
async function keptReply(
  { em }: Work,
  { key, scope }: RequestKey,
): Promise<{ requestHash: string; reply: unknown } | undefined> {
  const [row] = await em.execute<{ request_hash: string; reply: string }[]>(
    'SELECT request_hash, reply FROM idempotent_reply WHERE key = ? AND scope = ?',
    [key, scope],
  );
  return row && { requestHash: row.request_hash, reply: JSON.parse(row.reply) as unknown };
}

async function keepReply(
  { em, now }: Work,
  { key, scope, requestHash }: RequestKey,
  status: number,
  reply: unknown,
): Promise<void> {
  await em.execute(
    `INSERT INTO idempotent_reply (key, scope, request_hash, status, reply, created_at)
    VALUES (?, ?, ?, ?, ?, ?)`,
    [key, scope, requestHash, status, JSON.stringify(reply), now.toISOString()],
    'run',
  );
}
