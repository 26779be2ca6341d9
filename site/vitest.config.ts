import { defaultServerConditions } from 'vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: { conditions: ['source', ...defaultServerConditions] },
  ssr: { noExternal: ['@ellwand/shared'], resolve: { conditions: ['source', ...defaultServerConditions] } },
  test: { include: ['src/**/*.spec.{ts,tsx}'] },
});
