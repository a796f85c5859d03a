import { createHash } from 'node:crypto';
import type { Request } from 'express';
import type { Work } from '../work.ts';
import { IdempotentReply } from './idempotency.entity.ts';
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
  const earlier = await work.em.findOne(IdempotentReply, { key: asked.key, scope: asked.scope });
  if (earlier !== null) {
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
  work.em.create(IdempotentReply, { ...asked, status, reply, createdAt: work.now.toISOString() });
  await work.em.flush();
  return { reply, replayed: false };
}
