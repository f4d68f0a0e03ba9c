import { exitCodeOf, runOrFail } from './run-command.mjs';
import { Failure } from './failure.mjs';
import { logFile } from './places.mjs';
import { say } from './say.mjs';

const asRoot = async () => {
  if (process.getuid() === 0) return [];
  const mayWithoutPassword = (await exitCodeOf('sudo', ['-n', 'true'], { stdio: 'ignore' }).catch(() => 127)) === 0;
  return mayWithoutPassword ? ['sudo', '-n'] : undefined;
};

const aptExists = async () => (await exitCodeOf('apt-get', ['--version'], { stdio: 'ignore' }).catch(() => 127)) === 0;

/** Installs a package of the operating system where we are allowed to, else says how. */
export async function installSystemPackage(name, purpose) {
  const prefix = await asRoot();
  const byHand = `sudo apt-get update && sudo apt-get install -y ${name}`;
  if (!prefix || !(await aptExists())) {
    throw new Failure(`${purpose} is missing and cannot be installed from here. Run this once, then again: ${byHand}`);
  }
  say(`${purpose} is missing: installing the system package ${name}`);
  const log = logFile('apt');
  const apt = [...prefix, 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-o', 'DPkg::Lock::Timeout=180', '-q'];
  const sentence = `${purpose} could not be installed; try by hand: ${byHand}`;
  await runOrFail(sentence, apt[0], [...apt.slice(1), 'update'], { log });
  await runOrFail(sentence, apt[0], [...apt.slice(1), 'install', '-y', '--no-install-recommends', name], { log });
}
