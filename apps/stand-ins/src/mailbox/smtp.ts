import type { AddressInfo } from 'node:net';
import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import type { MailFolder } from './mail-folder.ts';

const largestMail = 25 * 1024 * 1024;

/** A mail server on this machine only, which keeps everything and delivers nothing. */
export function startSmtp(folder: MailFolder, port: number) {
  const server = new SMTPServer({
    name: 'mailbox.example.com',
    banner: 'stand-in mailbox; mail stays on this machine',
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: largestMail,
    onData: (stream, session, callback) => {
      receive(folder, stream, session).then(() => callback(), callback);
    },
  });
  server.on('error', (error) => console.error(error.message));
  return new Promise<{ url: string; close: () => Promise<void> }>((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      const taken = (server.server.address() as AddressInfo).port;
      resolve({
        url: `smtp://127.0.0.1:${taken}`,
        close: () => new Promise((closed) => server.close(closed)),
      });
    });
  });
}

/** The sender hears that its mail was accepted only once the file is there. */
async function receive(
  folder: MailFolder,
  stream: SMTPServerDataStream,
  session: SMTPServerSession,
): Promise<void> {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) chunks.push(chunk as Buffer);
  if (stream.sizeExceeded) {
    throw Object.assign(new Error('The mail is too large.'), { responseCode: 552 });
  }
  const recipients = session.envelope.rcptTo.map((recipient) => recipient.address);
  await folder.keep(Buffer.concat(chunks), recipients);
}
