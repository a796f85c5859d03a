import net from 'node:net';
import type { AddressInfo } from 'node:net';

interface LocalSmtp {
  url: string;
  /** Every mail taken so far, as it came over the wire. */
  mails: string[];
  /** While true, mails are refused for now. */
  refuse: boolean;
  close(): Promise<void>;
}

/** A mail server on this machine that takes what it is given: just enough of SMTP (RFC 5321) for one sender. */
export async function startLocalSmtp(): Promise<LocalSmtp> {
  const taken: LocalSmtp = { url: '', mails: [], refuse: false, close: async () => undefined };
  const server = net.createServer((socket) => {
    converse(socket, taken);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  taken.url = `smtp://127.0.0.1:${(server.address() as AddressInfo).port}`;
  taken.close = () => new Promise((resolve) => server.close(() => resolve()));
  return taken;
}

function converse(socket: net.Socket, taken: LocalSmtp): void {
  let waiting = '';
  let mail: string[] | undefined;
  socket.write('220 ready\r\n');
  socket.on('data', (part) => {
    const lines = `${waiting}${part.toString('utf8')}`.split('\r\n');
    waiting = lines.pop() ?? '';
    for (const line of lines) {
      if (mail === undefined) {
        if (/^DATA/i.test(line) && !taken.refuse) mail = [];
        socket.write(answer(line, taken.refuse));
        if (/^QUIT/i.test(line)) socket.end();
      } else if (line === '.') {
        taken.mails.push(mail.join('\r\n'));
        mail = undefined;
        socket.write('250 taken\r\n');
      } else mail.push(line.replace(/^\.\./, '.'));
    }
  });
}

function answer(line: string, refuse: boolean): string {
  if (/^EHLO|^HELO/i.test(line)) return '250 hello\r\n';
  if (/^DATA/i.test(line)) return refuse ? '451 not now\r\n' : '354 go on\r\n';
  if (/^QUIT/i.test(line)) return '221 bye\r\n';
  return '250 ok\r\n';
}
