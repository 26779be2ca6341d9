import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

/** shared's own TypeScript: what is tested is never a stale build, nor does it wait for one. */
const sharedSource = fileURLToPath(new URL('../shared/src/', import.meta.url));

export default defineConfig({
  resolve: { alias: [{ find: /^@ellwand\/shared\/(.*)$/, replacement: `${sharedSource}$1.ts` }] },
  test: { include: ['src/**/*.spec.ts'], testTimeout: 60_000 },
});
