import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { exclusively } from './exclusive.mjs';
import { ensureLocalDir } from './local-dir.mjs';
import { inRoot, logFile, root } from './places.mjs';
import { npmProgram } from './npm-program.mjs';
import { readIfThere, readJsonIfThere, writeWhole } from './whole-file.mjs';
import { commandLine, processesWorkingIn } from './living-process.mjs';
import { runNodeOrFail } from './run-node.mjs';
import { say } from './say.mjs';
import { waitUntil } from './wait-until.mjs';

const stampFile = inRoot('node_modules', '.chaffline-lock');

/** True when npm finished installing this very lockfile: it writes its own record last, after all packages. */
export function isInstalled(lock, installed) {
  if (!installed) return false;
  return Object.entries(lock.packages).every(([path, entry]) => {
    if (path === '' || entry.link) return true;
    const there = installed.packages[path];
    return there ? there.version === entry.version : Boolean(entry.optional || entry.peer);
  });
}

/** Installations whose command was killed: they end by themselves, but must not write into a newer one. */
const dyingInstallations = () => processesWorkingIn(root).filter((pid) => commandLine(pid)[0]?.startsWith('npm ci'));

async function install() {
  const lockText = readFileSync(inRoot('package-lock.json'), 'utf8');
  const wanted = createHash('sha256').update(lockText).digest('hex');
  if (readIfThere(stampFile)?.trim() === wanted) return false;
  const recordFile = inRoot('node_modules', '.package-lock.json');
  if (isInstalled(JSON.parse(lockText), readJsonIfThere(recordFile))) {
    writeWhole(stampFile, `${wanted}\n`);
    return false;
  }
  say('Installing packages: this takes a minute or two');
  const log = logFile('npm-ci');
  // NODE_ENV=production in the caller's environment would leave out what the build needs.
  const env = { ...process.env, NODE_ENV: 'development' };
  await waitUntil(() => dyingInstallations().length === 0, { withinMs: 15_000 });
  const args = [npmProgram(), 'ci', '--include=dev', '--no-audit', '--no-fund'];
  await runNodeOrFail('The packages could not be installed', args, { env, log, graceMs: 0 });
  writeWhole(stampFile, `${wanted}\n`);
  return true;
}

/** Packages as the lockfile wants them; an installation that was killed half-way is done again. True when it had to work. */
export async function ensurePackages() {
  ensureLocalDir();
  return exclusively('packages', install, () => say('Another command is installing packages: waiting'));
}
