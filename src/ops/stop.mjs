import { endLeftovers, forgetProduct, supervisorPid } from './product-record.mjs';
import { ensureLocalDir } from './local-dir.mjs';
import { exitWithFailure, Failure } from './failure.mjs';
import { isAlive } from './living-process.mjs';
import { otherUsers } from './database-users.mjs';
import { removeServerFile } from './server-file.mjs';
import { say } from './say.mjs';
import { stopPostgres } from './postgres.mjs';
import { waitUntil } from './wait-until.mjs';

const limitMs = 60_000;

async function stopProduct() {
  const pid = supervisorPid();
  if (pid === undefined) return false;
  process.kill(pid, 'SIGTERM');
  if (!(await waitUntil(() => !isAlive(pid), { withinMs: limitMs }))) {
    throw new Failure(`Process ${pid} did not stop within ${limitMs / 1000} s.`);
  }
  return true;
}

async function main() {
  ensureLocalDir();
  const stopped = await stopProduct();
  const leftovers = await endLeftovers();
  removeServerFile();
  forgetProduct();
  say(stopped || leftovers > 0 ? 'Chaffline stopped' : 'Chaffline was not running');
  if (otherUsers().length > 0) say('PostgreSQL is still used by another command: it stops with that');
  else if (await stopPostgres()) say('PostgreSQL stopped');
}

await main().catch(exitWithFailure);
