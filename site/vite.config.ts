import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defaultClientConditions, defaultServerConditions, defineConfig } from 'vite';

/**
 * Built twice: `vite build` for the browser (dist/client, with a manifest that the API reads), and
 * `vite build --ssr` for the server, in one file that needs nothing beside it.
 */
export default defineConfig(({ isSsrBuild }) => ({
  plugins: [react(), tailwindcss()],
  publicDir: isSsrBuild ? false : 'public',
  resolve: { conditions: ['source', ...defaultClientConditions] },
  ssr: { noExternal: true, resolve: { conditions: ['source', ...defaultServerConditions] } },
  define: isSsrBuild ? { 'process.env.NODE_ENV': JSON.stringify('production') } : {},
  build: isSsrBuild
    ? { target: 'node20', emptyOutDir: true }
    : {
        outDir: 'dist/client',
        emptyOutDir: true,
        manifest: true,
        target: 'es2022',
        rolldownOptions: { input: 'src/entry-client.tsx' },
      },
}));
