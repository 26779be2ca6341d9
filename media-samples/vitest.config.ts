import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { conditions: ['source'] },
  test: { include: ['src/**/*.spec.ts'], testTimeout: 60_000 },
});
