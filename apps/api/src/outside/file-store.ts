import { createHash, randomUUID } from 'node:crypto';
import { mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';

/** Files that never change, each named by the SHA-256 of its bytes. */
export class FileStore {
  readonly #folder: string;

  constructor(folder: string) {
    this.#folder = folder;
  }

  /** Keeps the bytes and gives their name; keeping the same bytes again changes nothing. */
  async keep(bytes: Uint8Array): Promise<string> {
    const hash = createHash('sha256').update(bytes).digest('hex');
    await mkdir(this.#folder, { recursive: true });
    const unfinished = path.join(this.#folder, `.${randomUUID()}`);
    await writeFile(unfinished, bytes, { flush: true });
    await rename(unfinished, this.#path(hash));
    return hash;
  }

  async read(hash: string): Promise<Buffer> {
    return readFile(this.#path(hash));
  }

  #path(hash: string): string {
    if (!/^[0-9a-f]{64}$/.test(hash))
      throw new TypeError('A kept file is named by the hash of its bytes');
    return path.join(this.#folder, hash);
  }
}
