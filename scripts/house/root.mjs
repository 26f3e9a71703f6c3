import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The repository's top folder. */
export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** A path below the top folder. */
export const inRoot = (...parts) => path.join(root, ...parts);
