import { createWriteStream, existsSync, renameSync, statSync } from 'node:fs';
import path from 'node:path';

const largest = 10 * 1024 * 1024;

/** The server's log beside its data: one file of at most 10 MB and its predecessor. */
export function openLog(dataDir) {
  const file = path.join(dataDir, 'hidewright.log');
  let size = existsSync(file) ? statSync(file).size : 0;
  let stream = createWriteStream(file, { flags: 'a' });
  return {
    file,
    write(line) {
      if (size > largest) {
        stream.end();
        renameSync(file, `${file}.1`);
        stream = createWriteStream(file, { flags: 'a' });
        size = 0;
      }
      size += Buffer.byteLength(line) + 1;
      stream.write(`${line}\n`);
    },
    close: () => new Promise((resolve) => stream.end(resolve)),
  };
}
