import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';
import { sharedSource } from './shared-source.js';

export default defineConfig({
  plugins: [react()],
  resolve: { alias: sharedSource },
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
