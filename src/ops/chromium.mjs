import { accessSync, constants } from 'node:fs';
import { Failure } from './failure.mjs';
import { installSystemPackage } from './system-package.mjs';

const program = '/usr/bin/chromium';

function isThere() {
  try {
    accessSync(program, constants.X_OK);
    return true;
  } catch {
    return false; // absent and forbidden come to the same here
  }
}

/** The browser of the end-to-end tests. */
export async function ensureChromium() {
  if (isThere()) return program;
  await installSystemPackage('chromium', 'The browser for the tests');
  if (!isThere()) throw new Failure(`Chromium was installed, but ${program} is not there.`);
  return program;
}
