import { ensureProgramsBuilt } from './workspace/programs-build.mjs';
import { ensureInstalled } from './workspace/installed.mjs';
import { apiFolder, apiProgram, withAbsolutePaths } from './workspace/launch.mjs';
import { openLog } from './workspace/log-file.mjs';
import { startMailbox } from './workspace/mailbox.mjs';
import { untilHealthy } from './workspace/healthy.mjs';
import { watchParent } from './workspace/parent.mjs';
import { startService } from './workspace/service.mjs';
import { readSettings, reachable, SettingError } from './workspace/settings.mjs';
import { ensureWebBuilt } from './workspace/web-build.mjs';

const services = [];
let ending = false;

/** The server first, so that it can still hand over mail; then what it leans on. */
async function end(code) {
  if (ending) return;
  ending = true;
  for (const service of services.reverse()) await service.stop();
  process.exit(code);
}

function startApi(settings, mailbox, log) {
  const handed = mailbox ? { SMTP_URL: mailbox.smtp, MAILBOX_URL: mailbox.web } : {};
  return startService(process.execPath, apiProgram('server'), {
    cwd: apiFolder,
    env: {
      ...withAbsolutePaths(),
      MODE: settings.mode,
      HOST: settings.host,
      PORT: String(settings.port),
      DATA_DIR: settings.dataDir,
      ...handed,
    },
    onLine: (line) => {
      log.write(line);
      sayWhenFatal(line);
    },
    onErrorLine: (line) => console.error(line),
  });
}

/** The log is JSON for machines; what ends the server is said to the person as well. */
function sayWhenFatal(line) {
  if (!line.includes('"level":60')) return;
  const { msg, err } = JSON.parse(line);
  console.error([msg, err?.message].filter(Boolean).join(': '));
}

/** The address comes last, where the eye is. */
function announce(settings, mailbox) {
  if (settings.mode === 'demo') {
    console.log('Sign in as owner@example.com, maker@example.com or bookkeeper@example.com;');
    console.log('the password of all three is marlpit-by-the-fen.');
  }
  if (mailbox) console.log(`Mail stays on this machine: read it at ${mailbox.web}`);
  console.log(`Hidewright is ready at ${settings.address}`);
}

async function start() {
  const settings = await readSettings(process.argv.slice(2), process.env);
  await ensureInstalled();
  await ensureWebBuilt();
  await ensureProgramsBuilt();
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));
  watchParent(() => void end(0));

  const mailbox =
    settings.mode === 'demo' && !process.env.SMTP_URL
      ? await startMailbox(settings.dataDir, process.env)
      : undefined;
  if (mailbox) services.push(mailbox);
  if (settings.isNew && settings.mode === 'demo') console.error('Making the demo workshop …');

  const log = openLog(settings.dataDir);
  const api = startApi(settings, mailbox, log);
  services.push(api);
  void api.ended.then((code) => {
    if (!ending) console.error(`The server has ended (exit code ${code}). Its log is ${log.file}`);
    return end(code === 0 ? 1 : code);
  });
  const where = { host: reachable(settings.host), port: settings.port, tls: settings.tls };
  if ((await untilHealthy(where, api.ended)) && !ending) announce(settings, mailbox);
}

try {
  await start();
} catch (error) {
  console.error(error instanceof SettingError ? error.message : error);
  await end(1);
}
