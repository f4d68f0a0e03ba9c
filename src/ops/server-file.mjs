import { rmSync } from 'node:fs';
import { inLocal } from './places.mjs';
import { isAlive } from './living-process.mjs';
import { readJsonIfThere, writeWhole } from './whole-file.mjs';

const file = inLocal('server.json');

/** What scripts may know of the running product. It holds the database's password: only its owner reads it. */
export const writeServerFile = (facts) => writeWhole(file, `${JSON.stringify(facts, null, 2)}\n`, 0o600);

export const removeServerFile = () => rmSync(file, { force: true });

/** The facts of a product that runs now; those of a killed one count for nothing. */
export function runningServerFile() {
  const facts = readJsonIfThere(file);
  return facts && isAlive(facts.pid) ? facts : undefined;
}
