import { cp, rm } from 'node:fs/promises';
import { inject } from 'vitest';
import type { TestProject } from 'vitest/node';
import { startHidewright, temporaryFolder, type Hidewright } from './hidewright.ts';

declare module 'vitest' {
  interface ProvidedContext {
    madeDemo: string;
  }
}

/** Makes the demo workshop once for all browser tests: a year of work takes half a minute to play. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const dataDir = await temporaryFolder();
  const made = await startHidewright({ dataDir });
  await made.stop();
  project.provide('madeDemo', dataDir);
  return () => rm(dataDir, { recursive: true, force: true });
}

/** Starts Hidewright on a copy of that demo, which is removed at the end. */
export async function startDemo(): Promise<Hidewright> {
  const dataDir = await temporaryFolder();
  await cp(inject('madeDemo'), dataDir, { recursive: true });
  const hidewright = await startHidewright({ dataDir });
  return {
    ...hidewright,
    stop: async () => {
      const code = await hidewright.stop();
      await rm(dataDir, { recursive: true, force: true });
      return code;
    },
  };
}
