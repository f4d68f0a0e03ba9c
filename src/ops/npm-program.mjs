import { existsSync, realpathSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';
import { Failure } from './failure.mjs';

/** npm's own script, so that it can be run as a Node process that ends with us: two installations at once would ruin both. */
export function npmProgram() {
  const dirs = [dirname(process.execPath), ...(process.env.PATH ?? '').split(delimiter).filter(Boolean)];
  const found = dirs
    .map((dir) => join(dir, 'npm'))
    .filter(existsSync)
    .map((path) => realpathSync(path));
  const script = found.find((path) => path.endsWith('.js'));
  if (!script) throw new Failure('npm was not found beside Node or on the PATH: install Node.js with npm.');
  return script;
}
