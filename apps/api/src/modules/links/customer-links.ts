import { createHash, randomBytes } from 'node:crypto';
import type { Work } from '../../work.ts';
import { CustomerLink } from './customer-link.entity.ts';

const dayMs = 24 * 60 * 60_000;
/** After the offer has run out, the customer can still look up what it was. */
const daysBeyondOffer = 90;

/** Only this is kept: who reads the database cannot make a link of it. */
const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex');

/** Makes a link of 256 random bits for a quote and gives its token, which can never be told again. */
export async function issueLink(work: Work, quoteId: number, validUntil: string): Promise<string> {
  const token = randomBytes(32).toString('base64url');
  work.em.create(CustomerLink, {
    tokenHash: tokenHash(token),
    quoteId,
    expiresAt: new Date(
      Date.parse(`${validUntil}T23:59:59.999Z`) + daysBeyondOffer * dayMs,
    ).toISOString(),
    createdAt: work.now.toISOString(),
  });
  await work.em.flush();
  return token;
}

/** The quote that a token opens now; nothing when it is unknown, has expired or was stopped. */
export async function quoteBehind(work: Work, token: string): Promise<number | undefined> {
  const link = await work.em.findOne(CustomerLink, { tokenHash: tokenHash(token) });
  if (link === null || link.revokedAt !== null || link.expiresAt <= work.now.toISOString())
    return undefined;
  return link.quoteId;
}

/** Stops every link of a quote, and says how many there were. */
export async function revokeLinks(work: Work, quoteId: number): Promise<number> {
  const links = await work.em.find(CustomerLink, { quoteId, revokedAt: null });
  for (const link of links) link.revokedAt = work.now.toISOString();
  await work.em.flush();
  return links.length;
}
