import { config } from 'zod';

/** Imported before any schema: zod otherwise tries whether code may be made from text, which the content policy forbids. */
config({ jitless: true });
