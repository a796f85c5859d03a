import path from 'node:path';
import { defineConfig, type TestProjectInlineConfiguration } from 'vitest/config';

/** Time limits are for hangs only; speed is measured by the benches. */
const hang = { testTimeout: 60_000, hookTimeout: 120_000 };

function unit(name: string, root: string): TestProjectInlineConfiguration {
  return { test: { name, root, include: ['**/*.test.{ts,tsx}'], ...hang } };
}

/** Tests of what keeps nothing from one call to the next: reading it in once serves every file. */
function pure(name: string, root: string): TestProjectInlineConfiguration {
  const { test } = unit(name, root);
  return { test: { ...test, isolate: false } };
}

/** Whole programs started as processes: one at a time, since each wants a core and a half. */
function whole(name: string, root: string, include: string): TestProjectInlineConfiguration {
  return {
    test: { name, root, include: [include], fileParallelism: false, ...longHang },
  };
}

const longHang = { testTimeout: 300_000, hookTimeout: 600_000 };

/** Browser walks, each on a copy of one demo, two side by side; one that a busy machine tripped goes once more. */
const walks: TestProjectInlineConfiguration = {
  test: {
    name: 'e2e',
    root: 'tests/e2e',
    include: ['**/*.e2e.ts'],
    retry: 1,
    globalSetup: [path.resolve(import.meta.dirname, 'tests/support/made-demo.ts')],
    ...longHang,
  },
};

export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      pure('domain', 'packages/domain'),
      pure('contract', 'packages/contract'),
      unit('web', 'apps/web'),
      unit('stand-ins', 'apps/stand-ins'),
      unit('lint', 'tests/lint'),
      pure('published', 'tests/published'),
      'apps/*/vitest.config.ts',
      walks,
      whole('commands', 'tests/commands', '**/*.test.ts'),
      whole('sheets', 'tests/sheets', '**/*.test.ts'),
      whole('drills', 'tests/drills', '**/*.drill.ts'),
    ],
  },
});
