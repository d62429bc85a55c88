import { config } from 'zod';

/**
 * zod asks once whether it may compile its checks with `new Function`; our Content-Security-Policy
 * says no, and the browser reports the question. Stands before the first import of a schema.
 */
config({ jitless: true });
