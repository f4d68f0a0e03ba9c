import { existsSync, openSync, renameSync } from 'node:fs';
import { logFile } from './places.mjs';

/** A fresh log for each start of the product; the one before is kept beside it. */
export function openProcessLog(name) {
  const path = logFile(name);
  if (existsSync(path)) renameSync(path, logFile(`${name}.before`));
  return openSync(path, 'a');
}
