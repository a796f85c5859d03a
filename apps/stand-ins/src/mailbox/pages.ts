import { splitAtLinks } from './links.ts';
import type { Message } from './message.ts';

const special: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => special[character] ?? '');
}

export function listPage(messages: readonly Message[]): string {
  if (messages.length === 0) {
    return wholePage(
      'Mailbox',
      '<p class="empty">No mail yet. Send a quote from the counter, and it arrives here.</p>',
    );
  }
  return wholePage('Mailbox', `<ul class="mails">${messages.map(listItem).join('')}</ul>`);
}

function listItem(message: Message): string {
  return `<li><a href="/messages/${message.id}">
    <span class="subject">${escaped(message.subject)}</span>
    <span class="to">to ${escaped(message.to)}</span>
    ${sentAt(message)}
  </a></li>`;
}

export function messagePage(message: Message): string {
  return wholePage(
    message.subject,
    `<p class="back"><a href="/">All mail</a></p>
    <article class="mail">
      <dl>
        <dt>From</dt><dd>${escaped(message.from)}</dd>
        <dt>To</dt><dd>${escaped(message.to)}</dd>
        <dt>Sent</dt><dd>${sentAt(message)}</dd>
      </dl>
      <pre>${clickable(message.text)}</pre>
      ${attachments(message)}
      ${asSent(message)}
    </article>`,
  );
}

export function absentPage(): string {
  return wholePage(
    'Not here',
    '<p class="empty">There is no such mail. <a href="/">All mail</a></p>',
  );
}

function clickable(text: string): string {
  return splitAtLinks(text)
    .map(({ text: shown, href }) =>
      href === undefined ? escaped(shown) : `<a href="${escaped(href)}">${escaped(shown)}</a>`,
    )
    .join('');
}

function attachments({ id, attachments: files }: Message): string {
  if (files.length === 0) return '';
  const items = files.map((file, index) => {
    const name = escaped(file.filename ?? 'attachment');
    const size = Math.ceil(file.size / 1024);
    return `<li><a href="/messages/${id}/attachments/${index}">${name}</a> (${size} kB)</li>`;
  });
  return `<h2>Attached</h2><ul>${items.join('')}</ul>`;
}

/** The sender's own mark-up, in a frame that can run nothing and load nothing. */
function asSent({ id, html }: Message): string {
  if (html === undefined) return '';
  return `<h2>As sent</h2>
    <iframe title="The mail as sent" src="/messages/${id}/html"
      sandbox="allow-popups allow-top-navigation-by-user-activation"></iframe>`;
}

function sentAt({ date }: Message): string {
  return `<time datetime="${date}">${date.slice(0, 16).replace('T', ' ')} UTC</time>`;
}

function wholePage(title: string, body: string): string {
  return `<!doctype html>
<html lang="en">
  <head>
    <meta charset="utf-8">
    <meta name="viewport" content="width=device-width, initial-scale=1">
    <title>${escaped(title)} · stand-in mailbox</title>
    <link rel="stylesheet" href="/style.css">
  </head>
  <body>
    <p class="note">Stand-in mailbox: this mail was not delivered to anybody and stays on this machine.</p>
    <main>
      <h1>${escaped(title)}</h1>
      ${body}
    </main>
  </body>
</html>`;
}
