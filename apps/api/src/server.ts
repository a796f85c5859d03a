import { createApp } from './app.ts';
import { startLapsing } from './background/lapsing.ts';
import { startOutbox } from './background/outbox.ts';
import { readConfig } from './config.ts';
import { closeContext, createContext } from './context.ts';
import { listen } from './http/listen.ts';
import { makeDemo } from './seeders/demo/make-demo.ts';

async function start(): Promise<void> {
  const config = readConfig(process.env);
  if (config.mode === 'demo') await makeDemo(config);
  const context = await createContext(config);
  const server = await listen(await createApp(context), config);
  const background = [startOutbox(context), startLapsing(context)];
  context.log.info({ port: server.port, host: config.host, mode: config.mode }, 'listening');
  let ending: Promise<void> | undefined;
  const end = () => {
    ending ??= Promise.all([server.close(), ...background.map((each) => each.stop())])
      .then(() => closeContext(context))
      .then(() => {
        if (process.connected) process.disconnect();
      });
  };
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, end);
  // The launcher holds the other end: when it is gone, nobody else would end this.
  process.on('disconnect', end);
}

start().catch((error: unknown) => {
  const sentence = error instanceof Error ? error.message : String(error);
  process.stderr.write(`${sentence}\n`);
  process.exit(1);
});
