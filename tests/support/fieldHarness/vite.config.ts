/** Serves the field screens over the memory store: npx vite --config tests/support/fieldHarness/vite.config.ts */
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

export default defineConfig({
  root: import.meta.dirname,
  appType: 'spa',
  plugins: [react(), tailwindcss()],
  server: { fs: { allow: ['../../..'] } },
});
