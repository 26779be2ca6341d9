import type { VitePWAOptions } from 'vite-plugin-pwa';

/**
 * The Workroom's service worker keeps the shell and nothing else: no answer of the API ever passes through it. A new
 * one waits until somebody says yes, and nobody is asked while readings wait to be sent.
 */
export const offlineShell: Partial<VitePWAOptions> = {
  registerType: 'prompt',
  injectRegister: null,
  filename: 'service-worker.js',
  manifestFilename: 'workroom.webmanifest',
  manifest: {
    id: '/workroom/',
    name: 'Ellwand Workroom',
    short_name: 'Workroom',
    description: 'Measuring historic dress, also where there is no network.',
    lang: 'en-GB',
    start_url: '/workroom/',
    scope: '/workroom/',
    display: 'standalone',
    background_color: '#F6F7F5',
    theme_color: '#17212B',
    icons: [
      { src: 'icon.svg', sizes: 'any', type: 'image/svg+xml', purpose: 'any' },
      { src: 'icon-maskable.svg', sizes: 'any', type: 'image/svg+xml', purpose: 'maskable' },
    ],
  },
  workbox: {
    globPatterns: ['**/*.{html,js,css,woff2,svg,webmanifest}'],
    navigateFallback: '/workroom/index.html',
    navigateFallbackAllowlist: [/^\/workroom(\/|$)/],
    // A printed sheet is a document of its own, not a screen.
    navigateFallbackDenylist: [/^\/api\//],
    cleanupOutdatedCaches: true,
    clientsClaim: true,
    inlineWorkboxRuntime: true,
    sourcemap: false,
  },
};
