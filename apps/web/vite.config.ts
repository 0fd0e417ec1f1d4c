import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';

const api = process.env.API_URL ?? 'http://127.0.0.1:8080';

/** Builds dist for the API to serve. Nothing is inlined, so that a strict content policy holds. */
export default defineConfig({
  root: import.meta.dirname,
  plugins: [react(), tailwindcss()],
  resolve: { conditions: ['source', ...defaultClientConditions] },
  build: { assetsInlineLimit: 0, modulePreload: { polyfill: false }, target: 'es2022', chunkSizeWarningLimit: 400 },
  server: { proxy: { '/api': api, '/livez': api, '/readyz': api, '/version': api } },
  preview: { proxy: { '/api': api } },
});
