import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

/** Where the API answers while the client is served by Vite; in production one process serves both. */
const api = process.env.API_URL ?? 'http://127.0.0.1:3000';

export default defineConfig({
  root: import.meta.dirname,
  plugins: [react(), tailwindcss()],
  server: { host: '127.0.0.1', proxy: { '/api': { target: api, changeOrigin: false } } },
  build: {
    target: 'es2022',
    // The content security policy allows fonts and scripts from this origin only: nothing is inlined as data.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    // Names every chunk and what it imports: the size figures are computed from it.
    manifest: true,
  },
});
