import path from 'node:path';
import { MailFolder } from './mailbox/mail-folder.ts';
import { startReader } from './mailbox/reader.ts';
import { startSmtp } from './mailbox/smtp.ts';

const { MODE, DATA_DIR = 'data', MAILBOX_PORT = '0' } = process.env;

if (MODE === 'shop') {
  console.error('A real shop does not use the stand-in mailbox. Set SMTP_URL to a mail server.');
  process.exit(1);
}

const folder = new MailFolder(path.join(path.resolve(DATA_DIR), 'mailbox'));
const smtp = await startSmtp(folder, Number(MAILBOX_PORT));
const reader = await startReader(folder);
console.log(JSON.stringify({ smtp: smtp.url, web: reader.url }));

async function end() {
  await Promise.all([smtp.close(), reader.close()]);
  process.exit(0);
}
let ending = false;
// The launcher's channel closes when the launcher is gone, however it ended.
for (const event of ['SIGINT', 'SIGTERM', 'SIGHUP', 'disconnect'] as const) {
  process.on(event, () => {
    if (!ending) void end();
    ending = true;
  });
}
