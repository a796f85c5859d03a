import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: { name: 'published', environment: 'node', include: ['**/*.test.ts'] },
});
