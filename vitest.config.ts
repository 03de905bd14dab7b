import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    globalSetup: './test/generate.ts',
    reporters: ['default', './test/last-line.ts'],
    projects: [
      { test: { name: 'source', include: ['test/**/*.test.ts'], exclude: ['test/dist/**', 'test/browser/**'], testTimeout: 30_000 } },
      { test: { name: 'dist', include: ['test/dist/**/*.test.ts'], testTimeout: 120_000 } },
      { test: { name: 'browser', include: ['test/browser/**/*.test.ts'], testTimeout: 120_000, hookTimeout: 120_000 } },
    ],
  },
});
