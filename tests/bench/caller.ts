import http from 'node:http';

export type Caller = <Reply>(method: string, path: string, body?: unknown) => Promise<Reply>;

interface Answer {
  status: number;
  cookie: string | undefined;
  text: string;
}

/** Calls an API as one person, who stays signed in, over one connection: Node's own client adds least to its time. */
export function callerOf(url: string): Caller {
  const agent = new http.Agent({ keepAlive: true, maxSockets: 1 });
  let cookie = '';
  return async <Reply>(method: string, path: string, body?: unknown): Promise<Reply> => {
    const headers = {
      cookie,
      origin: url,
      'content-type': 'application/json',
      'idempotency-key': crypto.randomUUID(),
    };
    const sent = body === undefined ? '' : JSON.stringify(body);
    const answer = await send(`${url}/api${path}`, { method, headers, agent }, sent);
    if (answer.status >= 400) throw new Error(`${method} ${path}: ${answer.status} ${answer.text}`);
    cookie = answer.cookie ?? cookie;
    return JSON.parse(answer.text) as Reply;
  };
}

function send(url: string, options: http.RequestOptions, body: string): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const request = http.request(url, options, (response) => {
      let text = '';
      response.setEncoding('utf8');
      response.on('data', (chunk: string) => (text += chunk));
      response.once('error', reject);
      response.once('end', () => {
        const [cookie] = response.headers['set-cookie'] ?? [];
        resolve({ status: response.statusCode ?? 0, cookie: cookie?.split(';')[0], text });
      });
    });
    request.once('error', reject);
    request.end(body);
  });
}
