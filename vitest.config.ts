import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));
const alias = { '@': root.replace(/\/$/, ''), 'server-only': `${root}tests/setup/server-only.ts` };

/** `unit` needs nothing but Node; `reference` asks other programs for the answer; `integration` wants DATABASE_URL. */
export default defineConfig({
  plugins: [react()],
  resolve: { alias },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: ['lib/**/*.test.ts', 'features/**/*.test.{ts,tsx}', 'components/**/*.test.tsx', 'tests/unit/**/*.test.ts'],
          setupFiles: ['tests/setup/console-fails.ts'],
        },
      },
      {
        extends: true,
        test: { name: 'reference', include: ['tests/reference/**/*.test.ts'], setupFiles: ['tests/setup/console-fails.ts'], testTimeout: 60_000 },
      },
      {
        extends: true,
        test: {
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          setupFiles: ['tests/setup/console-fails.ts'],
          globalSetup: ['tests/setup/database.ts'],
          fileParallelism: false,
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
