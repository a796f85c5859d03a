import { transform } from 'esbuild';
import { defineConfig, type Plugin } from 'vitest/config';

/** MikroORM's reflection finds an entity's file by its decorators, which only esbuild's output shows it in. */
const entities: Plugin = {
  name: 'entities-by-esbuild',
  enforce: 'pre',
  async transform(code, id) {
    if (!id.endsWith('.entity.ts')) return null;
    return transform(code, {
      loader: 'ts',
      sourcefile: id,
      sourcemap: true,
      target: 'es2022',
      tsconfigRaw: {
        compilerOptions: { experimentalDecorators: true, useDefineForClassFields: false },
      },
    });
  },
};

export default defineConfig({
  plugins: [entities],
  test: {
    name: 'api',
    include: ['src/**/*.test.ts'],
    // Reading the whole application in takes longer than most tests; each shop has a database of its own.
    isolate: false,
    testTimeout: 60_000,
    hookTimeout: 60_000,
  },
});
