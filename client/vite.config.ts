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
    rolldownOptions: {
      output: {
        codeSplitting: {
          // Else a group would drag along what its modules import, and the first load with it.
          includeDependenciesRecursively: false,
          groups: [
            // What every first load needs, and what changes only with a dependency.
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
