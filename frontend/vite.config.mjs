import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';

const backendPort = process.env.PORT ?? '3000';

export default defineConfig({
  plugins: [react()],
  // The engineering core comes as its TypeScript, so that the browser bundle never depends on a stale build of it.
  // The condition has a name of its own, because other packages use plain `source` for files not meant for bundlers.
  resolve: { conditions: ['resistry-source', ...defaultClientConditions] },
  server: {
    host: '127.0.0.1',
    port: 5173,
    proxy: { '/api': { target: `http://127.0.0.1:${backendPort}`, changeOrigin: false } },
  },
  build: {
    outDir: 'dist',
    target: 'es2022',
    // A strict content policy refuses data: fonts and scripts, so nothing is inlined.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    chunkSizeWarningLimit: 700,
  },
});
