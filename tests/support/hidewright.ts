import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..', '..');

export interface StartOptions {
  /** Kept afterwards; without it a new one is made, and removed at the end. */
  dataDir?: string;
  mode?: 'demo' | 'shop';
  env?: Record<string, string>;
}

export interface Hidewright {
  url: string;
  /** Where the stand-in mailbox is read; empty in a real shop. */
  mailboxUrl: string;
  dataDir: string;
  /** Everything it has said on the terminal. */
  said: () => string;
  /** Ends it in order, and returns its exit code. */
  stop: () => Promise<number>;
}

/** Settings of the person who runs the tests must not reach the program under test. */
const quiet = {
  PUBLIC_URL: '',
  SMTP_URL: '',
  TLS_CERT: '',
  TLS_KEY: '',
  MAILBOX_PORT: '',
  CARDS_PORT: '',
  MODE: '',
};

export async function temporaryFolder(): Promise<string> {
  return mkdtemp(path.join(tmpdir(), 'hidewright-'));
}

/** `npm start` without npm: the same script, with the settings given and nothing else. */
export function launchStart(args: string[], env: Record<string, string>): ChildProcess {
  return spawn(process.execPath, [path.join(root, 'scripts', 'start.mjs'), ...args], {
    cwd: root,
    env: { ...process.env, ...quiet, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
}

/** Starts Hidewright on a free port, as a person does, and waits until it is ready. */
export async function startHidewright(options: StartOptions = {}): Promise<Hidewright> {
  const dataDir = options.dataDir ?? (await temporaryFolder());
  const child = launchStart(options.mode === 'shop' ? ['--shop'] : [], {
    PORT: '0',
    DATA_DIR: dataDir,
    SIGN_IN_LIMIT: '1000',
    ...options.env,
  });
  const said = listenTo(child);
  const kill = () => child.kill('SIGKILL');
  process.once('exit', kill);
  const url = await readyAddress(child, said);
  return {
    url,
    mailboxUrl: /read it at (\S+)/.exec(said())?.[1] ?? '',
    dataDir,
    said,
    stop: async () => {
      process.off('exit', kill);
      const code = await end(child);
      if (options.dataDir === undefined) await rm(dataDir, { recursive: true, force: true });
      return code;
    },
  };
}

export function listenTo(child: ChildProcess): () => string {
  let said = '';
  const keep = (chunk: Buffer) => (said += chunk.toString('utf8'));
  child.stdout?.on('data', keep);
  child.stderr?.on('data', keep);
  return () => said;
}

function readyAddress(child: ChildProcess, said: () => string): Promise<string> {
  return new Promise((resolve, reject) => {
    child.stdout?.on('data', () => {
      const address = /Hidewright is ready at (\S+)\n/.exec(said())?.[1];
      if (address !== undefined) resolve(address);
    });
    child.once('close', (code) =>
      reject(new Error(`Hidewright ended with ${code} before it was ready:\n${said()}`)),
    );
  });
}

async function end(child: ChildProcess): Promise<number> {
  if (child.exitCode !== null) return child.exitCode;
  const closed = once(child, 'close') as Promise<[number | null]>;
  child.kill('SIGTERM');
  const [code] = await closed;
  return code ?? 128;
}
