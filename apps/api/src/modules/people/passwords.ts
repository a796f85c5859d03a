import { hash, verify } from '@node-rs/argon2';

/** argon2id, as OWASP advises at the least: 19 MiB, two passes, one lane. */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** The same characters typed on two keyboards must give the same bytes. */
const normalised = (password: string) => password.normalize('NFC');

export function hashPassword(password: string): Promise<string> {
  return hash(normalised(password), parameters);
}

let nobody: Promise<string> | undefined;

/** Takes as long for an unknown person as for a wrong password. */
export async function checkPassword(kept: string | undefined, password: string): Promise<boolean> {
  nobody ??= hashPassword('nobody has this password, it only takes its time');
  const matches = await verify(kept ?? (await nobody), normalised(password));
  return kept !== undefined && matches;
}
