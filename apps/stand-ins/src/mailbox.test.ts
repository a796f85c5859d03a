import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { once } from 'node:events';
import { get } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { createTransport } from 'nodemailer';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';

interface Shown {
  id: string;
  to: string;
  subject: string;
  date: string;
  text: string;
  links: string[];
  attachments: { name: string; path: string }[];
}

let dataDir: string;
let mailbox: ChildProcess;
let smtp: string;
let web: string;

function launch(env: Record<string, string>): ChildProcess {
  return spawn(process.execPath, ['--import', 'tsx', 'src/mailbox.ts'], {
    cwd: path.resolve(import.meta.dirname, '..'),
    env: { ...process.env, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
}

async function firstLine(child: ChildProcess): Promise<string> {
  const [line] = (await once(createInterface({ input: child.stdout! }), 'line')) as [string];
  return line;
}

beforeAll(async () => {
  dataDir = await mkdtemp(path.join(tmpdir(), 'mailbox-'));
  mailbox = launch({ DATA_DIR: dataDir, MAILBOX_PORT: '0', MODE: 'demo' });
  ({ smtp, web } = JSON.parse(await firstLine(mailbox)) as { smtp: string; web: string });
});

afterAll(async () => {
  mailbox.kill('SIGTERM');
  const [code] = (await once(mailbox, 'close')) as [number | null];
  await rm(dataDir, { recursive: true });
  expect(code).toBe(0);
});

async function messages(): Promise<Shown[]> {
  return (await (await fetch(`${web}/messages`)).json()) as Shown[];
}

function send(mail: Record<string, unknown>) {
  return createTransport(smtp).sendMail({
    from: 'Marlpit Leather <counter@example.com>',
    to: 'The Copper Heron <heron@example.com>',
    subject: 'Your quote',
    text: 'Hello',
    ...mail,
  });
}

describe('a mail sent by SMTP', () => {
  beforeEach(async () => {
    await send({
      subject: 'Quote Q-0241 · 250 coasters – ½ ready',
      text: 'Read it at http://127.0.0.1:4370/link/abc.\n<script>alert(1)</script>',
      html: '<p>Read it <a href="http://127.0.0.1:4370/link/abc">here</a></p><script>1</script>',
      date: new Date('2026-03-04T05:06:07Z'),
      attachments: [{ filename: 'Q-0241.pdf', content: Buffer.from('%PDF-1.7 test') }],
    });
  });

  test('is read back as it was meant', async () => {
    const [mail] = await messages();
    expect(mail).toMatchObject({
      to: 'heron@example.com',
      subject: 'Quote Q-0241 · 250 coasters – ½ ready',
      date: '2026-03-04T05:06:07.000Z',
      links: ['http://127.0.0.1:4370/link/abc'],
    });
    expect(mail?.text).toContain('<script>alert(1)</script>');
  });

  test('is kept as a file that names whom it was for', async () => {
    const files = await readdir(path.join(dataDir, 'mailbox'));
    expect(files.every((file) => file.endsWith('.eml'))).toBe(true);
    const newest = files.sort().at(-1) ?? '';
    const raw = await readFile(path.join(dataDir, 'mailbox', newest), 'utf8');
    expect(raw).toMatch(/^Delivered-To: heron@example\.com\r\n/);
  });

  test('is shown with a link to follow and nothing that runs', async () => {
    const [mail] = await messages();
    const reply = await fetch(`${web}/messages/${mail?.id}`);
    const html = await reply.text();
    expect(html).toContain('<a href="http://127.0.0.1:4370/link/abc">');
    expect(html).not.toContain('<script>');
    expect(reply.headers.get('content-security-policy')).toContain("default-src 'none'");
    const asSent = await fetch(`${web}/messages/${mail?.id}/html`);
    expect(asSent.headers.get('content-security-policy')).toMatch(/sandbox(?!.*allow-scripts)/);
  });

  test('hands out its attachments as they were', async () => {
    const [mail] = await messages();
    const reply = await fetch(`${web}${mail?.attachments[0]?.path}`);
    expect(await reply.text()).toBe('%PDF-1.7 test');
    expect(reply.headers.get('content-disposition')).toContain("filename*=UTF-8''Q-0241.pdf");
  });
});

test('the newest mail comes first, also of many sent at once', async () => {
  for (const number of [1, 2, 3]) await send({ subject: `Mail ${number}` });
  const subjects = (await messages()).slice(0, 3).map((mail) => mail.subject);
  expect(subjects).toEqual(['Mail 3', 'Mail 2', 'Mail 1']);
  expect(await (await fetch(web)).text()).toContain('Mail 3');
});

test('a mail with hidden recipients says whom it was for only in its file', async () => {
  await send({ to: undefined, bcc: 'hidden@example.com', subject: 'Hidden' });
  const mail = (await messages()).find((one) => one.subject === 'Hidden');
  expect(mail?.to).toBe('hidden@example.com');
});

test('a mail that is too large is refused', async () => {
  const large = send({ subject: 'Large', text: 'x'.repeat(26 * 1024 * 1024) });
  await expect(large).rejects.toThrow(/size|large/i);
  expect((await messages()).some((mail) => mail.subject === 'Large')).toBe(false);
});

test('a name outside the folder finds nothing', async () => {
  for (const id of ['..%2F..%2Fpackage', '000000000000000-00000000', '%00']) {
    expect((await fetch(`${web}/messages/${id}`)).status).toBe(404);
  }
});

test("another site's name for this machine is refused", async () => {
  const status = await new Promise((resolve, reject) => {
    get(`${web}/messages`, { headers: { host: 'rebound.example.com' } }, (reply) => {
      reply.resume();
      resolve(reply.statusCode);
    }).on('error', reject);
  });
  expect(status).toBe(421);
});

test('[S40] a real shop cannot start it', async () => {
  const refused = launch({ DATA_DIR: dataDir, MODE: 'shop' });
  const [code] = (await once(refused, 'close')) as [number | null];
  expect(code).toBe(1);
});
