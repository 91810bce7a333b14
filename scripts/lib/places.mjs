// Where things lie in the checkout. Everything the scripts make themselves is under `.data` and `dist`.
import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');
export const dataDir = path.resolve(process.env.DATA_DIR || path.join(root, '.data'));
export const distDir = path.join(root, 'dist');
export const testDir = path.join(root, '.data', 'test');

export const fromRoot = (...parts) => path.join(root, ...parts);
