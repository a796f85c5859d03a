import { randomBytes } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { readFile, readdir, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { readMessage, type Message } from './message.ts';

const fileName = /^[0-9]{15}-[0-9a-f]{8}\.eml$/;

/** Mail as files that any mail program can open, named so that their order is that of arrival. */
export class MailFolder {
  readonly #folder: string;
  #latest = 0;

  constructor(folder: string) {
    this.#folder = folder;
    mkdirSync(folder, { recursive: true });
  }

  async keep(raw: Buffer, recipients: readonly string[]): Promise<void> {
    const name = this.#nextName();
    const delivered = recipients.map((address) => `Delivered-To: ${address}\r\n`).join('');
    const file = path.join(this.#folder, name);
    await writeFile(`${file}.part`, Buffer.concat([Buffer.from(delivered), raw]));
    await rename(`${file}.part`, file);
  }

  /** Newest first. */
  async list(most = 200): Promise<Message[]> {
    const names = (await readdir(this.#folder)).filter((name) => fileName.test(name));
    const newest = names.sort().reverse().slice(0, most);
    return Promise.all(newest.map((name) => this.#read(name)));
  }

  async find(id: string): Promise<Message | undefined> {
    const name = `${id}.eml`;
    if (!fileName.test(name)) return undefined;
    const names = await readdir(this.#folder);
    return names.includes(name) ? this.#read(name) : undefined;
  }

  async #read(name: string): Promise<Message> {
    const raw = await readFile(path.join(this.#folder, name));
    return readMessage(name.replace(/\.eml$/, ''), raw);
  }

  /** Two mails within one millisecond still keep their order. */
  #nextName(): string {
    this.#latest = Math.max(Date.now(), this.#latest + 1);
    return `${String(this.#latest).padStart(15, '0')}-${randomBytes(4).toString('hex')}.eml`;
  }
}
