import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { OutgoingMail } from './outgoing-mail.entity.ts';

/** A mail to be sent from the shop's name; files are named by their hash in the file store. */
export interface NewMail {
  recipient: string;
  subject: string;
  body: string;
  attachments: { name: string; hash: string; type: string }[];
  subjectKind: 'quote' | 'order' | 'invoice' | 'purchase order';
  subjectId: number;
}

const leaseMs = 2 * 60_000;
const mostAttempts = 8;
const firstWaitMs = 30_000;

/** Puts a mail into the outbox, in the transaction of whatever it tells about; the background sends it. */
export async function enqueueMail(work: Work, mail: NewMail): Promise<OutgoingMail> {
  const at = work.now.toISOString();
  const row = work.em.create(OutgoingMail, {
    ...mail,
    subject: mail.subject.replaceAll(/[\r\n]+/g, ' '),
    state: 'waiting',
    nextTryAt: at,
    createdAt: at,
  });
  await work.em.flush();
  return row;
}

/**
 * Takes the next mail that is due, so that no other sender takes it as well. A sender that dies leaves its lease
 * to run out, and the mail is taken again.
 */
export async function leaseMail(work: Work): Promise<OutgoingMail | null> {
  const at = work.now.toISOString();
  const mail = await work.em.findOne(
    OutgoingMail,
    {
      state: 'waiting',
      nextTryAt: { $lte: at },
      $or: [{ leaseUntil: null }, { leaseUntil: { $lte: at } }],
    },
    { orderBy: { nextTryAt: 'asc', id: 'asc' } },
  );
  if (mail === null) return null;
  mail.attempts += 1;
  mail.leaseUntil = new Date(work.now.getTime() + leaseMs).toISOString();
  await work.em.flush();
  return mail;
}

/** Notes that a mail has left; the words it carried are no longer needed, and may hold a customer's link. */
export async function markSent(work: Work, id: number): Promise<void> {
  const mail = await work.em.findOneOrFail(OutgoingMail, id);
  Object.assign(mail, {
    state: 'sent',
    sentAt: work.now.toISOString(),
    leaseUntil: null,
    lastError: null,
  });
  mail.body = withoutToken(mail.body);
  await work.em.flush();
  await logDeed(work, {
    action: `mailed “${mail.subject}”`,
    subjectKind: 'mail',
    subjectId: mail.id,
  });
}

/** Notes that a try failed: the next one comes later each time, and after the last the mail is given up. */
export async function markFailed(work: Work, id: number, why: string): Promise<void> {
  const mail = await work.em.findOneOrFail(OutgoingMail, id);
  mail.leaseUntil = null;
  mail.lastError = why.slice(0, 300);
  mail.nextTryAt = new Date(
    work.now.getTime() + firstWaitMs * 2 ** (mail.attempts - 1),
  ).toISOString();
  if (mail.attempts < mostAttempts) {
    await work.em.flush();
    return;
  }
  mail.state = 'failed';
  mail.body = withoutToken(mail.body);
  await work.em.flush();
  await logDeed(work, {
    action: `gave up mailing “${mail.subject}”`,
    subjectKind: 'mail',
    subjectId: mail.id,
  });
}

const withoutToken = (body: string) => body.replaceAll(/\/c\/[A-Za-z0-9_-]+/g, '/c/…');
