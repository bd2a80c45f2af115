import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

// The client. In development Express mounts Vite as middleware, so that one process serves both.
export default defineConfig({
  plugins: [react(), tailwindcss()],
  build: {
    outDir: 'dist/client',
    emptyOutDir: true,
    manifest: true,
    // The content security policy allows no data: addresses, so nothing is inlined.
    assetsInlineLimit: 0,
    // The polyfill would be an inline script; every browser the style sheet needs preloads by itself.
    modulePreload: { polyfill: false },
  },
});
