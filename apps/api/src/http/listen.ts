import { readFile } from 'node:fs/promises';
import http from 'node:http';
import https from 'node:https';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import type { Config } from '../config.ts';

interface Listening {
  port: number;
  /** Lets the requests under way finish, then stops. */
  close(): Promise<void>;
}

export async function listen(app: Express, config: Config): Promise<Listening> {
  const server = await serverFor(app, config);
  await new Promise<void>((resolve, reject) => {
    server.once('error', (error) => {
      reject(
        inUse(error)
          ? new Error(
              `Port ${config.port} is in use. Stop what uses it, or set PORT to another one.`,
            )
          : error,
      );
    });
    server.listen(config.port, config.host, resolve);
  });
  return { port: (server.address() as AddressInfo).port, close: () => closed(server) };
}

async function serverFor(app: Express, config: Config): Promise<http.Server> {
  if (config.tls === undefined) return http.createServer(app);
  const [cert, key] = await Promise.all([
    readFile(config.tls.certFile),
    readFile(config.tls.keyFile),
  ]);
  return https.createServer({ cert, key }, app);
}

function closed(server: http.Server): Promise<void> {
  return new Promise((resolve, reject) => {
    server.close((error) => {
      if (error === undefined) resolve();
      else reject(error);
    });
    server.closeIdleConnections();
  });
}

const inUse = (error: Error) => 'code' in error && error.code === 'EADDRINUSE';
