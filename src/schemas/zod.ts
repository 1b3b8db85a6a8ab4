import { config } from 'zod';

/**
 * zod as every schema imports it. Where it can, zod compiles objects to code with `new Function`;
 * a page's policy forbids that, and the browser reports the mere attempt as a breach.
 */
if ('document' in globalThis) config({ jitless: true });

export * from 'zod';
