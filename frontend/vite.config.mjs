import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';

/** The alphabets that every page shows from its first line on: Latin, and Greek for Ω and µ. */
const fontsOfFirstLine = /source-sans-3-(?:latin|greek)-wght-normal-.*\.woff2$/;

/** Announces them in the built index.html: else the browser learns of them only when it lays the first text out. */
const announceFonts = {
  name: 'announce-fonts',
  transformIndexHtml: {
    order: 'post',
    handler: (_html, { bundle = {} }) =>
      Object.keys(bundle)
        .filter((file) => fontsOfFirstLine.test(file))
        .map((file) => ({
          tag: 'link',
          attrs: { rel: 'preload', as: 'font', type: 'font/woff2', crossorigin: '', href: `/${file}` },
          injectTo: 'head',
        })),
  },
};

const backendPort = process.env.PORT ?? '3000';

export default defineConfig({
  plugins: [react(), announceFonts],
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
