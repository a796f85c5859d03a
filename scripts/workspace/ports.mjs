import { createServer } from 'node:net';

/**
 * Asks the system whether a port can be listened on; 0 asks for any free one.
 * @returns {Promise<{port: number} | {fault: string}>} the port, or the system's word for what is wrong
 */
export function tryPort(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) => resolve({ fault: error.code ?? error.message }));
    server.listen(port, host, () => {
      const taken = server.address().port;
      server.close(() => resolve({ port: taken }));
    });
  });
}

export function portSentence(fault, port, host) {
  if (fault === 'EADDRINUSE') {
    return `Port ${port} is in use on ${host}. Stop what uses it, or choose another: PORT=4371 npm start`;
  }
  if (fault === 'EACCES') {
    return `Port ${port} may not be used by this account. Choose one above 1023: PORT=4370 npm start`;
  }
  return `Hidewright cannot listen on ${host}:${port} (${fault}). Check HOST and PORT.`;
}
