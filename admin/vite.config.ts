import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';
import { offlineShell } from './offline-shell.js';
import { sharedSource } from './shared-source.js';

export default defineConfig({
  // The service worker's scope and every built address follow from this one line.
  base: '/workroom/',
  plugins: [react(), tailwindcss(), VitePWA(offlineShell)],
  resolve: { alias: sharedSource },
  build: {
    outDir: 'dist',
    manifest: true,
    // The API's content policy allows no inlined fonts: every asset keeps an address of its own.
    assetsInlineLimit: 0,
    rolldownOptions: {
      output: {
        codeSplitting: {
          // The setting that keeps schemas from writing code must lie before the first schema.
          groups: [
            { name: 'schemas', test: /plain-schemas|node_modules[\\/]zod/, priority: 2 },
            // Each file costs the service worker a turn: what every page needs comes in one.
            { name: 'shell', tags: ['$initial'], priority: 1 },
          ],
        },
      },
    },
  },
});
