import { readFileSync } from 'node:fs';

/** The parent of a process, where the system tells (on Linux). */
function parentOf(pid) {
  try {
    return /^PPid:\s*(\d+)/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1];
  } catch {
    return undefined;
  }
}

/** npm starts a script through a shell: the shell is this program's parent, and npm is the shell's. */
const ancestors = () => `${process.ppid} ${parentOf(process.ppid)}`;

/**
 * Calls `gone` when the npm that started this program has gone. Its shell does not pass signals on, so that ending
 * npm would otherwise leave the server running on its port.
 */
export function watchParent(gone) {
  if (process.env.npm_lifecycle_event === undefined) return;
  const atFirst = ancestors();
  const timer = setInterval(() => {
    if (ancestors() === atFirst) return;
    clearInterval(timer);
    gone();
  }, 250);
  timer.unref();
}
