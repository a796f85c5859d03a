import { accessSync, constants, existsSync, mkdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { inRoot } from './paths.mjs';
import { portSentence, tryPort } from './ports.mjs';

/** Something the person can put right; its message is the whole story. */
export class SettingError extends Error {}

function readMode(args, env) {
  const unknown = args.find((arg) => arg !== '--shop');
  if (unknown !== undefined) {
    throw new SettingError(
      `There is no option ${unknown}. Use --shop for a real shop, or none for the demo.`,
    );
  }
  const mode = args.includes('--shop') ? 'shop' : env.MODE || 'demo';
  if (mode !== 'demo' && mode !== 'shop') {
    throw new SettingError(`MODE is ${mode}; it can be demo or shop.`);
  }
  return mode;
}

function refuseStandIns(env) {
  const named = ['MAILBOX_PORT', 'MAILBOX_URL', 'CARDS_PORT'].filter((name) => env[name]);
  if (named.length === 0) return;
  throw new SettingError(
    `A real shop uses no stand-ins: leave out ${named.join(' and ')}. Set SMTP_URL for real mail.`,
  );
}

function usableFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true });
    if (!statSync(folder).isDirectory()) throw Object.assign(new Error(), { code: 'ENOTDIR' });
    accessSync(folder, constants.W_OK | constants.X_OK);
  } catch (error) {
    throw new SettingError(
      `The data folder ${folder} cannot be written to (${error.code}). ` +
        'Change its permissions, or choose another: DATA_DIR=some/folder npm start',
    );
  }
  return folder;
}

async function usablePort(env, host) {
  const text = env.PORT || '4370';
  const wanted = Number(text);
  if (!Number.isInteger(wanted) || wanted < 0 || wanted > 65_535) {
    throw new SettingError(`PORT is ${text}; it must be a whole number from 0 (any) to 65535.`);
  }
  const tried = await tryPort(wanted, host);
  if (tried.fault) throw new SettingError(portSentence(tried.fault, wanted, host));
  return tried.port;
}

/** Everything that starting depends on, checked before anything is started. */
export async function readSettings(args, env) {
  const mode = readMode(args, env);
  if (mode === 'shop') refuseStandIns(env);
  const dataDir = usableFolder(
    env.DATA_DIR ? path.resolve(env.DATA_DIR) : inRoot(mode === 'shop' ? 'data-shop' : 'data'),
  );
  const host = env.HOST || '127.0.0.1';
  const port = await usablePort(env, host);
  const tls = Boolean(env.TLS_CERT && env.TLS_KEY);
  return {
    mode,
    dataDir,
    host,
    port,
    tls,
    address: env.PUBLIC_URL || `${tls ? 'https' : 'http'}://${spoken(host)}:${port}`,
    isNew: !existsSync(path.join(dataDir, 'hidewright.sqlite')),
  };
}

/** A host that stands for every address is reached at this machine's own. */
export function reachable(host) {
  if (host === '0.0.0.0') return '127.0.0.1';
  return host === '::' ? '::1' : host;
}

function spoken(host) {
  const name = reachable(host);
  return name.includes(':') ? `[${name}]` : name;
}
