import path from 'node:path';
import { defineConfig } from 'vitest/config';

const root = path.resolve(__dirname, '..');
const alias = { '@': root, 'server-only': path.join(__dirname, 'setup', 'server-only.ts') };
const shared = { globals: false, setupFiles: ['tests/setup/no-console-error.ts'], restoreMocks: true };

export default defineConfig({
  root,
  resolve: { alias },
  test: {
    reporters: process.env.VITEST_JSON ? ['default', ['json', { outputFile: process.env.VITEST_JSON }]] : ['default'],
    projects: [
      { root, resolve: { alias }, test: { ...shared, name: 'unit', include: ['tests/unit/**/*.test.{ts,tsx}'] } },
      { root, resolve: { alias }, test: { ...shared, name: 'reference', include: ['tests/reference/**/*.test.ts'] } },
      {
        root,
        resolve: { alias },
        test: {
          ...shared,
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          globalSetup: ['tests/setup/base-database.ts'],
          testTimeout: 20_000,
        },
      },
    ],
  },
});
