import type { Context } from '../context.ts';
import { leaseMail, markFailed, markSent } from '../modules/mail/outbox.ts';
import type { OutgoingMail } from '../modules/mail/outgoing-mail.entity.ts';
import { Person } from '../modules/people/person.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Letter } from '../outside/mailer.ts';
import { inTransaction, theProgram } from '../work.ts';
import { repeat, type Repeating } from './repeat.ts';

/** Sends what waits in the outbox, every other second. */
export function startOutbox(context: Context): Repeating {
  return repeat('the outbox', 2000, context.log, async () => {
    await sendDueMail(context);
  });
}

/**
 * Sends every mail that is due now, and says how many have left. A mail leaves at least once: should the program
 * stop between sending and noting it, the second copy carries the same Message-ID.
 */
export async function sendDueMail(context: Context): Promise<number> {
  if (!context.mailer.available) return 0;
  let sent = 0;
  for (;;) {
    const mail = await inTransaction(context, theProgram, leaseMail);
    if (mail === null) return sent;
    if (await sendOne(context, mail)) sent += 1;
  }
}

async function sendOne(context: Context, mail: OutgoingMail): Promise<boolean> {
  try {
    await context.mailer.send(await letterOf(context, mail));
  } catch (error) {
    const why = error instanceof Error ? error.message : 'The mail server did not take it.';
    context.log.warn({ mail: mail.id, attempts: mail.attempts }, 'a mail did not leave');
    await inTransaction(context, theProgram, (work) => markFailed(work, mail.id, why));
    return false;
  }
  await inTransaction(context, theProgram, (work) => markSent(work, mail.id));
  return true;
}

async function letterOf(context: Context, mail: OutgoingMail): Promise<Letter> {
  const em = context.orm.em.fork();
  const workshop = await em.findOneOrFail(Workshop, 1);
  const owner = await em.findOneOrFail(
    Person,
    { role: 'owner', active: true },
    { orderBy: { id: 'asc' } },
  );
  const attachments = mail.attachments.map(async ({ name, type, hash }) => ({
    filename: name,
    contentType: type,
    content: await context.files.read(hash),
  }));
  return {
    from: { name: workshop.name, address: owner.email },
    to: mail.recipient,
    subject: mail.subject,
    text: mail.body,
    messageId: `<mail-${mail.id}.${Date.parse(mail.createdAt)}@${owner.email.split('@')[1] ?? 'localhost'}>`,
    attachments: await Promise.all(attachments),
  };
}
