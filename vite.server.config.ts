import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vite';

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

/** The server, the demo and the two workers, each an entry of its own; packages stay in node_modules. */
export default defineConfig({
  publicDir: false,
  build: {
    ssr: true,
    outDir: 'dist/server',
    target: 'node20',
    sourcemap: true,
    rollupOptions: {
      input: {
        index: at('server/index.ts'),
        demo: at('seed/demo.ts'),
        worker: at('server/analysis/worker.ts'),
        'search-worker': at('server/search/worker.ts'),
      },
      output: { entryFileNames: '[name].js', chunkFileNames: 'chunks/[name]-[hash].js' },
    },
  },
});
