import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';

const api = path.resolve(import.meta.dirname, '..', '..', 'apps', 'api');

interface Server {
  url: string;
  /** Takes its life as a power cut would: nothing is flushed, nothing is said. */
  kill: () => Promise<void>;
}

/** The API alone, as built and as a process that can be killed; a planted defect is loaded before it. */
export async function startServer(dataDir: string, planted?: string): Promise<Server> {
  const preload =
    planted === undefined ? [] : ['--import', path.join(import.meta.dirname, 'planted', planted)];
  const program = path.join(api, 'dist', 'server.mjs');
  const child = spawn(process.execPath, [...preload, program], {
    cwd: api,
    env: {
      ...process.env,
      MODE: 'shop',
      DATA_DIR: dataDir,
      PORT: '0',
      HOST: '127.0.0.1',
      SMTP_URL: '',
      SIGN_IN_LIMIT: '1000',
      LOG_LEVEL: 'info',
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const url = `http://127.0.0.1:${await portOf(child)}`;
  return {
    url,
    kill: async () => {
      const closed = once(child, 'close');
      child.kill('SIGKILL');
      await closed;
    },
  };
}

/** The log says where it listens. */
function portOf(child: ChildProcess): Promise<number> {
  let said = '';
  return new Promise((resolve, reject) => {
    child.once('close', () => reject(new Error(`The server ended before it listened:\n${said}`)));
    child.stdout?.on('data', (chunk: Buffer) => {
      said += chunk.toString('utf8');
      const port = /"port":(\d+),[^\n]*"msg":"listening"/.exec(said)?.[1];
      if (port !== undefined) resolve(Number(port));
    });
  });
}
