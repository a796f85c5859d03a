export type Caller = <Reply>(method: string, path: string, body?: unknown) => Promise<Reply>;

/** Calls an API as one person, who stays signed in. */
export function callerOf(url: string): Caller {
  let cookie = '';
  return async <Reply>(method: string, path: string, body?: unknown): Promise<Reply> => {
    const response = await fetch(`${url}/api${path}`, {
      method,
      headers: {
        cookie,
        origin: url,
        'content-type': 'application/json',
        'idempotency-key': crypto.randomUUID(),
      },
      ...(body !== undefined && { body: JSON.stringify(body) }),
    });
    const text = await response.text();
    if (!response.ok) throw new Error(`${method} ${path}: ${response.status} ${text}`);
    cookie = response.headers.get('set-cookie')?.split(';')[0] ?? cookie;
    return JSON.parse(text) as Reply;
  };
}
