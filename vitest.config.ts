import { defineConfig } from 'vitest/config';
import { fileURLToPath } from 'node:url';

const serverOnly = fileURLToPath(new URL('./node_modules/server-only/empty.js', import.meta.url));

export default defineConfig({
  resolve: { tsconfigPaths: true, alias: { 'server-only': serverOnly } },
  test: {
    testTimeout: 60_000,
    hookTimeout: 120_000,
    env: { LOG_LEVEL: process.env.LOG_LEVEL ?? 'silent' },
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          environment: 'node',
          include: ['tests/**/*.test.ts'],
          exclude: ['tests/browser/**'],
          setupFiles: ['./tests/setup.ts'],
        },
      },
      {
        extends: true,
        test: { name: 'dom', environment: 'jsdom', include: ['tests/**/*.test.tsx'], setupFiles: ['./tests/setup.ts'] },
      },
    ],
  },
});
