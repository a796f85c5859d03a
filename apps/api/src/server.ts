import { createApp } from './app.ts';
import { readConfig } from './config.ts';
import { closeContext, createContext } from './context.ts';
import { listen } from './http/listen.ts';

async function start(): Promise<void> {
  const config = readConfig(process.env);
  const context = await createContext(config);
  const server = await listen(await createApp(context), config);
  context.log.info({ port: server.port, host: config.host, mode: config.mode }, 'listening');
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => {
      void server.close().then(() => closeContext(context));
    });
  }
}

start().catch((error: unknown) => {
  const sentence = error instanceof Error ? error.message : String(error);
  process.stderr.write(`${sentence}\n`);
  process.exit(1);
});
