import { readdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;
const pages = readdirSync(resolve(root, 'notebooks'))
  .filter((name) => name.endsWith('.html'))
  .map((name) => resolve(root, 'notebooks', name));

export default defineConfig({
  root: resolve(root, 'notebooks'),
  base: './',
  publicDir: false,
  build: {
    outDir: resolve(root, 'dist'),
    emptyOutDir: true,
    target: 'es2022',
    rolldownOptions: { input: pages },
  },
  worker: { format: 'es' },
  server: { fs: { allow: [root] } },
  test: {
    root,
    include: ['test/**/*.test.ts'],
    exclude: ['test/browser/**', 'node_modules/**'],
    isolate: false,
    setupFiles: ['test/setup.ts'],
    benchmark: { include: ['test/bench/**/*.bench.ts'] },
  },
});
