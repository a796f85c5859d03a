import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';

/** How long a service may take over an orderly end. */
const patience = 15_000;

/**
 * A program that keeps running beside this one; over its channel it notices when this one is gone. Its lines are handed to `onLine` and `onErrorLine`;
 * `ended` resolves with its exit code.
 */
export function startService(command, args, { cwd, env, onLine, onErrorLine }) {
  const child = spawn(command, args, { cwd, env, stdio: ['ignore', 'pipe', 'pipe', 'ipc'] });
  createInterface({ input: child.stdout }).on('line', onLine);
  createInterface({ input: child.stderr }).on('line', onErrorLine);
  const ended = new Promise((resolve) => {
    child.on('error', () => resolve(127));
    child.on('close', (code) => resolve(code ?? 1));
  });
  return {
    ended,
    async stop() {
      if (child.exitCode !== null || child.signalCode !== null) return;
      const impatient = setTimeout(() => child.kill('SIGKILL'), patience);
      child.kill('SIGTERM');
      await ended;
      clearTimeout(impatient);
    },
  };
}
