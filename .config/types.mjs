// Types of each folder with the checker of TypeScript 7, which is named apart because the layer rules still need the older one's interface.
import { resolve } from 'node:path';
import { root, run } from './install.mjs';

const checker = resolve(root, 'node_modules/typescript7/bin/tsc');
for (const folder of ['lib', 'lib/cli', 'notebooks', 'test']) run(process.execPath, [checker, '-p', folder]);
