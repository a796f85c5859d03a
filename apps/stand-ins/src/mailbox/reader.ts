import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { MailFolder } from './mail-folder.ts';
import type { Message } from './message.ts';
import { absentPage, listPage, messagePage } from './pages.ts';
import { icon, style } from './style.ts';

interface Reply {
  status: number;
  type: string;
  body: string | Buffer;
  headers?: Record<string, string>;
}

/** Nothing of a mail runs or loads anything: no scripts, no pictures from outside, no forms. */
const pagePolicy =
  "default-src 'none'; style-src 'self'; img-src 'self'; frame-src 'self'; form-action 'none'; base-uri 'none'";
const mailPolicy =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; " +
  'sandbox allow-popups allow-top-navigation-by-user-activation';

/** Shows the mail of a folder on this machine only, to read and to follow its links. */
export function startReader(folder: MailFolder, port = 0) {
  const server = createServer((request, response) => {
    answer(folder, request).then(
      (reply) => send(response, reply),
      (error: unknown) => {
        console.error(error);
        send(response, { status: 500, type: 'text/plain', body: 'The mailbox has failed.' });
      },
    );
  });
  return new Promise<{ url: string; close: () => Promise<void> }>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      resolve({
        url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
        close: () => closeServer(server),
      });
    });
  });
}

function closeServer(server: ReturnType<typeof createServer>): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
}

async function answer(folder: MailFolder, request: IncomingMessage): Promise<Reply> {
  if (!isLocal(request.headers.host)) return plain(421, 'Read the mailbox by its own address.');
  if (request.method !== 'GET') return plain(405, 'The mailbox can only be read.');
  const [, place, id, part, number] = new URL(request.url ?? '/', 'http://mailbox').pathname.split(
    '/',
  );
  if (place === '') return page(listPage(await folder.list()));
  if (place === 'style.css') return { status: 200, type: 'text/css', body: style };
  if (place === 'favicon.ico') return { status: 200, type: 'image/svg+xml', body: icon };
  if (place !== 'messages') return page(absentPage(), 404);
  if (id === undefined || id === '') return json((await folder.list()).map(shown));
  const message = await folder.find(id);
  return (message && partOf(message, part, number)) ?? page(absentPage(), 404);
}

/** A page of another site must not read the mail by giving its own name this machine's address. */
function isLocal(host: string | undefined): boolean {
  return /^(127\.0\.0\.1|localhost|\[::1\])(:\d+)?$/.test(host ?? '');
}

function partOf(message: Message, part = '', number = ''): Reply | undefined {
  if (part === '') return page(messagePage(message));
  if (part === 'html' && message.html !== undefined) return html(message.html, mailPolicy);
  const attachment = part === 'attachments' ? message.attachments[Number(number)] : undefined;
  if (attachment === undefined) return undefined;
  const name = encodeURIComponent(attachment.filename ?? 'attachment');
  return {
    status: 200,
    type: 'application/octet-stream',
    body: attachment.content,
    headers: { 'content-disposition': `attachment; filename*=UTF-8''${name}` },
  };
}

function shown({ id, from, to, subject, date, text, links, attachments }: Message) {
  const files = attachments.map((file, index) => ({
    name: file.filename ?? 'attachment',
    size: file.size,
    path: `/messages/${id}/attachments/${index}`,
  }));
  return { id, from, to, subject, date, text, links, attachments: files };
}

function page(body: string, status = 200): Reply {
  return html(body, pagePolicy, status);
}

function html(body: string, policy: string, status = 200): Reply {
  return { status, type: 'text/html', body, headers: { 'content-security-policy': policy } };
}

function json(value: unknown): Reply {
  return { status: 200, type: 'application/json', body: JSON.stringify(value) };
}

function plain(status: number, body: string): Reply {
  return { status, type: 'text/plain', body };
}

function send(response: ServerResponse, { status, type, body, headers = {} }: Reply): void {
  const isText = typeof body === 'string';
  response.writeHead(status, {
    'content-type': isText ? `${type}; charset=utf-8` : type,
    'cache-control': 'no-store',
    'x-content-type-options': 'nosniff',
    'referrer-policy': 'no-referrer',
    ...headers,
  });
  response.end(body);
}
