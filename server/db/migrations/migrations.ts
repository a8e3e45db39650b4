import { CreateTables1767225600000 } from './CreateTables1767225600000.ts';

/** Every migration, listed once, oldest first. A test compares this list with the files of the folder. */
export const migrations = [CreateTables1767225600000];
