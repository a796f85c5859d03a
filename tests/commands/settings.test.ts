import { once } from 'node:events';
import { writeFile } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import path from 'node:path';
import { expect, test } from 'vitest';
import { launchStart, listenTo, temporaryFolder } from '../support/hidewright.ts';

async function outcome(args: string[], env: Record<string, string>) {
  const child = launchStart(args, { PORT: '0', DATA_DIR: await temporaryFolder(), ...env });
  const said = listenTo(child);
  const [code] = (await once(child, 'close')) as [number | null];
  return { code, said: said() };
}

test('a port in use is said in one sentence, with what to do', async () => {
  const other = createServer().listen(0, '127.0.0.1');
  await once(other, 'listening');
  const { port } = other.address() as AddressInfo;
  const { code, said } = await outcome([], { PORT: String(port) });
  other.close();
  expect(code).toBe(1);
  expect(said).toContain(
    `Port ${port} is in use on 127.0.0.1. Stop what uses it, or choose another`,
  );
  expect(said.trim().split('\n')).toHaveLength(1);
});

test.each(['99999', '-1', 'eighty', '4370.5'])('PORT=%s is refused', async (PORT) => {
  const { code, said } = await outcome([], { PORT });
  expect(code).toBe(1);
  expect(said).toContain(`PORT is ${PORT}; it must be a whole number`);
});

test('a data folder that cannot be one is said by name', async () => {
  const file = path.join(await temporaryFolder(), 'file');
  await writeFile(file, '');
  const { code, said } = await outcome([], { DATA_DIR: path.join(file, 'data') });
  expect(code).toBe(1);
  expect(said).toMatch(/The data folder .+ cannot be written to \(ENOTDIR\)\. .*DATA_DIR=/);
});

test('[S40] a real shop refuses the stand-ins', async () => {
  const { code, said } = await outcome(['--shop'], { MAILBOX_PORT: '2525' });
  expect(code).toBe(1);
  expect(said).toContain('A real shop uses no stand-ins: leave out MAILBOX_PORT.');
});

test('an option that does not exist is refused', async () => {
  const { code, said } = await outcome(['--shopp'], {});
  expect(code).toBe(1);
  expect(said).toContain('There is no option --shopp');
});
