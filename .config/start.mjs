// npm start: install when needed, build, serve on this machine only, print the address.
import { install, root, run } from './install.mjs';

install();
run('npx', ['vite', 'build', '--logLevel', 'warn']);
const { preview } = await import('vite');
const server = await preview({
  root: `${root}/notebooks`,
  configFile: `${root}/vite.config.ts`,
  logLevel: 'warn',
  preview: { host: '127.0.0.1', port: Number(process.env.PORT ?? 4173), strictPort: false },
});
const address = server.resolvedUrls?.local[0] ?? 'http://127.0.0.1:4173/';
process.stdout.write(`Spanledger is at ${address}  (Ctrl+C stops it)\n`);
