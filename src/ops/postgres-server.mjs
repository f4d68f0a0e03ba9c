import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, realpathSync, rmSync } from 'node:fs';
import { basename, join } from 'node:path';
import { Failure } from './failure.mjs';
import { asOwner } from './postgres-owner.mjs';
import { freePort } from './free-port.mjs';
import { commandLine, isAlive, processesWorkingIn, workingDir } from './living-process.mjs';
import { logFile } from './places.mjs';
import { readIfThere } from './whole-file.mjs';
import { say } from './say.mjs';
import { waitUntil } from './wait-until.mjs';

const preferredPort = 54180;
const startLimitMs = 180_000; // replaying the log after a crash takes its time

function sessionsOf(dataDir) {
  const here = existsSync(dataDir) ? processesWorkingIn(realpathSync(dataDir)) : [];
  return here.filter((pid) => basename(commandLine(pid)[0] ?? '').startsWith('postgres')); // not a shell that looks around
}

/** The server of this very folder: it works in it, while the pid file of a copied or crashed folder names a stranger. */
export function runningServer(dataDir) {
  const lines = readIfThere(join(dataDir, 'postmaster.pid'))?.split('\n');
  if (!lines) return undefined;
  const pid = Number(lines[0]);
  if (!isAlive(pid) || workingDir(pid) !== realpathSync(dataDir)) return undefined;
  return { pid, port: Number(lines[3]), ready: lines[7]?.trim() === 'ready' };
}

/** After a killed server its children end within moments; the shared memory they hold would stop a new one. */
async function clearAfterCrash(dataDir) {
  const ended = await waitUntil(() => sessionsOf(dataDir).length === 0, { withinMs: 5_000 });
  if (!ended) for (const pid of sessionsOf(dataDir)) process.kill(pid, 'SIGKILL');
  await waitUntil(() => sessionsOf(dataDir).length === 0, { withinMs: 5_000 });
  rmSync(join(dataDir, 'postmaster.pid'), { force: true });
}

function spawnServer(programs, owner, dataDir, port, log) {
  const settings = {
    listen_addresses: '127.0.0.1',
    unix_socket_directories: '',
    port,
    max_connections: 60,
    shared_buffers: '128MB',
    logging_collector: 'off',
  };
  const args = ['-D', dataDir, ...Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`])];
  const out = openSync(log, 'a');
  // Its own session: Ctrl-C is for the command that started it, which then stops the server in good order.
  const child = spawn(join(programs, 'postgres'), args, {
    ...asOwner(owner),
    stdio: ['ignore', out, out],
    detached: true,
  });
  closeSync(out);
  child.unref();
  return child;
}

async function whenReady(dataDir, child, log) {
  let failed;
  child?.once('error', (error) => (failed = error));
  const server = await waitUntil(
    () => {
      const now = runningServer(dataDir);
      if (now?.ready) return now;
      if (failed || (child && child.exitCode !== null)) return 'ended';
      return undefined;
    },
    { withinMs: startLimitMs },
  );
  if (server === undefined || server === 'ended') throw new Failure('PostgreSQL did not start.', log);
  return server;
}

/** The running server of the folder, started when there is none. */
export async function ensureServer(programs, owner, dataDir, rememberedPort) {
  const log = logFile('postgres');
  const running = runningServer(dataDir);
  if (running) return { ...(await whenReady(dataDir, undefined, log)), startedHere: false };
  await clearAfterCrash(dataDir);
  const wanted = rememberedPort ?? preferredPort;
  const port = await freePort(wanted, preferredPort);
  if (port !== wanted) say(`Port ${wanted} is taken: PostgreSQL listens on ${port}`);
  const server = await whenReady(dataDir, spawnServer(programs, owner, dataDir, port, log), log);
  return { ...server, startedHere: true };
}

/** Fast shutdown: sessions are ended, everything is written, nothing needs recovery. */
export async function stopServer(dataDir) {
  const server = runningServer(dataDir);
  if (!server) return false;
  process.kill(server.pid, 'SIGINT');
  const ended = await waitUntil(() => !isAlive(server.pid), { withinMs: 30_000 });
  if (!ended) throw new Failure(`PostgreSQL (process ${server.pid}) did not stop within 30 s.`, logFile('postgres'));
  return true;
}
