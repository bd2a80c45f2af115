import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

// Browser journeys run under Playwright (playwright.config.ts); scripts/test.ts runs both.
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'node',
          environment: 'node',
          include: [
            '{shared,server,seed}/**/*.test.ts',
            'tests/{api,reference,process,scripts}/**/*.test.ts',
          ],
          setupFiles: ['tests/support/node-setup.ts'],
          globalSetup: ['tests/support/migrated-database.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        plugins: [react()],
        test: {
          name: 'components',
          environment: 'jsdom',
          include: ['src/**/*.test.{ts,tsx}'],
          setupFiles: ['tests/support/components-setup.ts'],
        },
      },
    ],
  },
});
