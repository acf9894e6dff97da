import { realpathSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of this clone, every link resolved. */
export const cloneFolder = realpathSync(fileURLToPath(new URL('..', import.meta.url)));

/** Where the application keeps what isn't in the database: its secret, its files. */
export const dataFolder = process.env.STANCHION_DATA ?? join(cloneFolder, '.data');

/** A program that npm installed. */
export const installed = (name) => join(cloneFolder, 'node_modules', '.bin', name);
