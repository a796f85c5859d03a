import { ensureInstalled } from './workspace/installed.mjs';
import { apiFolder, withAbsolutePaths } from './workspace/launch.mjs';
import { startMailbox } from './workspace/mailbox.mjs';
import { watchParent } from './workspace/parent.mjs';
import { inRoot } from './workspace/paths.mjs';
import { ensureProgramsBuilt } from './workspace/programs-build.mjs';
import { startService } from './workspace/service.mjs';
import { readSettings } from './workspace/settings.mjs';

/** The API restarts when its sources change; Vite serves the pages and hands `/api` on to it. */
await ensureInstalled();
const settings = await readSettings(process.argv.slice(2), process.env);
const services = [];

async function end(code) {
  for (const service of services.splice(0).reverse()) await service.stop();
  process.exit(code);
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));
watchParent(() => void end(0));

const show = { onLine: (line) => console.log(line), onErrorLine: (line) => console.error(line) };
const env = {
  ...withAbsolutePaths(),
  MODE: settings.mode,
  HOST: settings.host,
  PORT: String(settings.port),
  DATA_DIR: settings.dataDir,
};
if (settings.mode === 'demo' && !env.SMTP_URL) {
  await ensureProgramsBuilt();
  const mailbox = await startMailbox(settings.dataDir, env);
  services.push(mailbox);
  Object.assign(env, { SMTP_URL: mailbox.smtp, MAILBOX_URL: mailbox.web });
  console.log(`Mail is read at ${mailbox.web}`);
}
const tsx = inRoot('node_modules', 'tsx', 'dist', 'cli.mjs');
const vite = inRoot('apps', 'web', 'node_modules', 'vite', 'bin', 'vite.js');
services.push(
  startService(process.execPath, [tsx, 'watch', 'src/server.ts'], { cwd: apiFolder, env, ...show }),
  startService(process.execPath, [vite, '--host', settings.host], {
    cwd: inRoot('apps', 'web'),
    env,
    ...show,
  }),
);
