import { createHash } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { join } from 'node:path';

export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
export const localDir = join(root, '.local');
export const logDir = join(localDir, 'log');

/** Distinguishes this checkout from others on the same machine. */
export const checkoutId = createHash('sha256').update(root).digest('hex').slice(0, 12);

export const inLocal = (...parts) => join(localDir, ...parts);
export const inRoot = (...parts) => join(root, ...parts);
export const logFile = (name) => join(logDir, `${name}.log`);
