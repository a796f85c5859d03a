import { randomBytes } from 'node:crypto';
import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';

/** Each data folder makes its own secret the first time it is opened. */
export async function sessionSecret(dataDir: string): Promise<string> {
  const file = path.join(dataDir, 'session-secret');
  try {
    await writeFile(file, randomBytes(48).toString('base64url'), {
      flag: 'wx',
      mode: 0o600,
      flush: true,
    });
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error;
  }
  return readFile(file, 'utf8');
}
