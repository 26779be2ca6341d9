import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: ['source'] },
  ssr: { resolve: { conditions: ['source'] } },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.spec.{ts,tsx}'],
    setupFiles: ['src/testing/set-up.ts'],
    css: false,
    // Two cores and whole screens in jsdom: a slow machine must not fail a right answer.
    testTimeout: 20_000,
    // jsdom's default address is opaque, and an opaque origin has no localStorage.
    environmentOptions: { jsdom: { url: 'http://127.0.0.1:4310/workroom/' } },
  },
});
