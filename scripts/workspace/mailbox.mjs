import { inRoot } from './paths.mjs';
import { startService } from './service.mjs';

/** Starts the stand-in mailbox and waits for its addresses: `{smtp, web, stop}`. */
export function startMailbox(dataDir, env) {
  return new Promise((resolve, reject) => {
    const faults = [];
    const service = startService(process.execPath, ['--enable-source-maps', 'dist/mailbox.mjs'], {
      cwd: inRoot('apps', 'stand-ins'),
      env: { ...env, DATA_DIR: dataDir },
      onLine: (line) => resolve({ ...JSON.parse(line), ...service }),
      onErrorLine: (line) => faults.push(line),
    });
    void service.ended.then(() =>
      reject(new Error(`The stand-in mailbox did not start. ${faults.join('\n')}`)),
    );
  });
}
