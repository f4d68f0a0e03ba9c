import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { ensurePackages } from './node-packages.mjs';
import { ensurePostgres } from './postgres.mjs';
import { exitWithFailure, Failure } from './failure.mjs';
import { childEnvironment } from './child-environment.mjs';
import { root } from './places.mjs';
import { sayOnStderr } from './say.mjs';

const passedOn = ['SIGINT', 'SIGTERM', 'SIGHUP'];

/** Our exit code is the script's; a script that a signal ended counts as shells count it. */
function runScript(script, args, env) {
  return new Promise((done, fail) => {
    const child = spawn(process.execPath, ['--import', 'tsx', script, ...args], { cwd: root, env, stdio: 'inherit' });
    const passOn = (signal) => child.kill(signal);
    for (const signal of passedOn) process.on(signal, passOn);
    child.once('error', fail);
    child.once('exit', (code, signal) => done(code ?? 128 + constants.signals[signal]));
  });
}

async function main([script, ...args]) {
  if (!script) throw new Failure('Usage: node src/ops/with-database.mjs <script.ts> [arguments]');
  sayOnStderr();
  await ensurePackages();
  const postgres = await ensurePostgres();
  try {
    process.exitCode = await runScript(script, args, childEnvironment({ databaseUrl: postgres.databaseUrl }));
  } finally {
    await postgres.stop();
  }
}

await main(process.argv.slice(2)).catch(exitWithFailure);
