import { readdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { runnerImport, type Plugin } from 'vite';
import { defineConfig } from 'vitest/config';
import { BaseSequencer, type TestSpecification } from 'vitest/node';

const root = import.meta.dirname;
const pages = readdirSync(resolve(root, 'notebooks'))
  .filter((name) => name.endsWith('.html'))
  .map((name) => resolve(root, 'notebooks', name));

/** Nothing from elsewhere, nothing evaluated, no inline style: the built pages work offline and cannot be talked into loading anything. */
const contentPolicy: Plugin = {
  name: 'content-policy',
  apply: 'build',
  transformIndexHtml: () => [
    {
      tag: 'meta',
      injectTo: 'head-prepend',
      attrs: {
        'http-equiv': 'Content-Security-Policy',
        content:
          "default-src 'none'; script-src 'self'; style-src 'self'; font-src 'self'; img-src 'self' data: blob:; worker-src 'self'; connect-src 'self'; base-uri 'none'; form-action 'none'",
      },
    },
  ],
};

/** The worked examples come worked out, so that a page has something to show at once. */
const workedAnswers: Plugin = {
  name: 'worked-answers',
  apply: 'build',
  async generateBundle() {
    const made = await runnerImport<{ workExamples: () => { name: string; text: string }[] }>(
      resolve(root, 'notebooks/worked/workExamples.ts'),
      { configFile: false, root, logLevel: 'silent' },
    );
    for (const { name, text } of made.module.workExamples())
      this.emitFile({ type: 'asset', fileName: `worked/${name}.json`, source: text });
  },
};

/** Tests that take longest, the longest first: what begins late keeps a processor waiting at the end. */
const longest = [
  'oracles/arrangePipeline',
  'properties/arrange',
  'examples',
  'explain/manual',
  'appraise/limitingSpan',
  'appraise/abutmentWindows',
  'appraise/memory',
  'appraise/appraise',
  'properties/road',
].map((name) => resolve(root, `test/${name}.test.ts`));

class LongestFirst extends BaseSequencer {
  override async sort(files: TestSpecification[]): Promise<TestSpecification[]> {
    const rank = ({ moduleId }: TestSpecification): number => {
      const at = longest.indexOf(moduleId);
      return at < 0 ? longest.length : at;
    };
    return (await super.sort(files)).sort((a, b) => rank(a) - rank(b));
  }
}

export default defineConfig({
  root: resolve(root, 'notebooks'),
  base: './',
  publicDir: false,
  plugins: [contentPolicy, workedAnswers],
  build: {
    outDir: resolve(root, 'dist'),
    emptyOutDir: true,
    target: 'es2022',
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    chunkSizeWarningLimit: 1500,
    rolldownOptions: { input: pages, checks: { bundlerTimings: false } },
  },
  worker: { format: 'es' },
  server: { fs: { allow: [root] } },
  test: {
    root,
    sequence: { sequencer: LongestFirst },
    benchmark: { include: ['test/bench/**/*.bench.ts'] },
    projects: [
      {
        test: {
          name: 'unit',
          root,
          include: ['test/**/*.test.ts'],
          exclude: ['test/browser/**'],
          isolate: false,
          // Left to itself the runner keeps a processor free.
          maxWorkers: '100%',
          // Sizing makes much that is short-lived: with room for it a tenth less time goes into collecting it.
          // Much runs for a second or two and never again: compiled plainly at once, and at length only once it has proved to
          // be worth it, the whole takes a fifth less of the processors.
          execArgv: ['--max-semi-space-size=64', '--always-sparkplug', '--interrupt-budget=264000'],
          setupFiles: ['test/setup.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        test: {
          name: 'browser',
          root,
          include: ['test/browser/**/*.test.ts'],
          isolate: false,
          fileParallelism: false,
          // What lies off the screen is drawn when the page is idle, which on a busy machine takes longer than the usual second.
          expect: { poll: { timeout: 30_000 } },
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
