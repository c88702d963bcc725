import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { laterChunk } from './later-chunk.ts';
import { shareWorkerChunks } from './share-worker-chunks.ts';

/** Where the API answers while the client is served by Vite; in production one process serves both. */
const api = process.env.API_URL ?? 'http://127.0.0.1:3000';

export default defineConfig({
  root: import.meta.dirname,
  plugins: [shareWorkerChunks(), react(), tailwindcss()],
  server: { host: '127.0.0.1', proxy: { '/api': { target: api, changeOrigin: false } } },
  build: {
    target: 'es2022',
    // The content security policy allows fonts and scripts from this origin only: nothing is inlined as data.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    // Names every chunk and what it imports: the size figures are computed from it.
    manifest: true,
    rolldownOptions: {
      // Reading a property does nothing in any module we have; without this the parts of the chart library that are
      // never registered stay, because they copy each other's defaults.
      treeshake: { propertyReadSideEffects: false },
      output: {
        codeSplitting: {
          groups: [
            {
              // The small parts nearly every screen uses travel together: one request instead of a dozen. Dialogs,
              // tabs and pickers stay with the screens that open them.
              name: 'kit',
              test: /web\/src\/(components|lib)\/(?!chart\/|working\/|combobox|confirm-dialog|dialog|menu|tabs|load-scale|quantity-field|room-summaries)|web\/src\/features\/(session|sites)|shared\/src\/(contracts\/(contract|problem|sessions|sites)|policy)/,
              minShareCount: 2,
            },
            // Mutations are used by lazy parts only; in a file of their own they would import the parts and be imported by them.
            { name: 'query', test: /node_modules\/@tanstack\// },
            // A group normally takes along all its modules import, which here would be the Book itself.
            { name: laterChunk(), debugName: 'later', includeDependenciesRecursively: false },
          ],
        },
      },
    },
  },
});
