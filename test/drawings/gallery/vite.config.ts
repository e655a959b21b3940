import { resolve } from 'node:path';
import { defineConfig } from 'vite';

/** `npx vite --config test/drawings/gallery/vite.config.ts` shows every drawing and chart with the fixture's figures. */
export default defineConfig({
  root: import.meta.dirname,
  publicDir: false,
  server: { port: 5199, fs: { allow: [resolve(import.meta.dirname, '../../..')] } },
});
