import { spawn } from 'node:child_process';
import { root } from './paths.mjs';

/**
 * Runs a program to its end and keeps what it said. Never rejects: a program that cannot be started has
 * exit code 127 and says why.
 */
export function run(command, args, { cwd = root, env = process.env, show = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd, env, stdio: ['ignore', 'pipe', 'pipe'] });
    const said = [];
    const keep = (chunk) => {
      said.push(chunk);
      if (show) process.stderr.write(chunk);
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    child.on('error', (error) => resolve({ code: 127, output: `${error.message}\n` }));
    child.on('close', (code, signal) =>
      resolve({ code: code ?? (signal ? 128 : 1), output: Buffer.concat(said).toString('utf8') }),
    );
  });
}

/** Hands the terminal over to a program and ends as it ends. */
export function become(command, args, { cwd = root, env = process.env } = {}) {
  const child = spawn(command, args, { cwd, env, stdio: 'inherit' });
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => child.kill(signal));
  }
  child.on('error', (error) => {
    console.error(error.message);
    process.exitCode = 127;
  });
  child.on('close', (code) => {
    process.exitCode = code ?? 1;
  });
}

export function tail(text, lines = 40) {
  return text.trimEnd().split('\n').slice(-lines).join('\n');
}
