// Types of each folder with the checker of TypeScript 7, which is named apart because the layer rules still need the older one's interface.
import { resolve } from 'node:path';
import { root, run } from './install.mjs';

// The tests stand on every other folder; each folder is checked once, with its own library of types.
run(process.execPath, [resolve(root, 'node_modules/typescript7/bin/tsc'), '--build', root]);
