import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const apiTarget = process.env.API_URL ?? 'http://127.0.0.1:3000';

export default defineConfig({
  plugins: [react()],
  resolve: {
    alias: [
      // The source itself, so that a change in shared is seen at once and unused files are left out of the bundle.
      {
        find: /^@emberlot\/shared\/(.*)$/,
        replacement: fileURLToPath(new URL('../shared/src/$1.ts', import.meta.url)),
      },
    ],
  },
  // The server puts a fresh value in the place of this word in every page it answers.
  html: { cspNonce: '__CSP_NONCE__' },
  server: { proxy: { '/api': { target: apiTarget, changeOrigin: false } } },
  build: {
    target: 'es2022',
    // Inlined fonts and pictures would need `data:` in the content security policy.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    manifest: true,
    // The data grid alone is larger than the usual limit; only screens with a list load it.
    chunkSizeWarningLimit: 700,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            // What every first load needs and changes only with a dependency. Nothing else is grouped by hand: a group
            // takes along all that its modules import, and a first load would have to take the group.
            {
              name: 'react',
              test: /node_modules\/(react|react-dom|scheduler|react-router|react-router-dom)\//,
              priority: 30,
            },
            {
              name: 'style',
              test: /node_modules\/(@emotion|stylis|@mui\/(system|styled-engine|private-theming|utils)|@mui\/material\/(styles|CssBaseline))\//,
              priority: 20,
            },
          ],
        },
      },
    },
  },
});
