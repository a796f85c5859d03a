import http from 'node:http';
import https from 'node:https';

/** True once the server answers that it is ready. Its certificate is its owner's business here. */
function isHealthy({ port, host, tls }) {
  return new Promise((resolve) => {
    const get = tls ? https.get : http.get;
    const options = { host, port, path: '/api/health', rejectUnauthorized: false, timeout: 2000 };
    const request = get(options, (reply) => {
      reply.resume();
      resolve(reply.statusCode === 200);
    });
    request.on('timeout', () => request.destroy());
    request.on('error', () => resolve(false));
  });
}

/** Waits until the server is ready, or until `given up` says that it never will be. */
export async function untilHealthy(address, ended) {
  let over = false;
  void ended.then(() => (over = true));
  while (!over) {
    if (await isHealthy(address)) return true;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return false;
}
