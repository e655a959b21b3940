import { z } from 'zod';

// The pages forbid evaluated code, so schemas must not compile themselves; whether they may is tried when the first one is
// made, at the price of an error and of reading the whole script once more. So this stands before every schema.
z.config({ jitless: true });

export { z };
