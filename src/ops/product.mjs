import { bundleThread } from './thread-bundle.mjs';
import { checkProductionEnvironment } from './production-environment.mjs';
import { childEnvironment, isProduction } from './child-environment.mjs';
import { demoAccounts, sayDemoAccounts } from './demo.mjs';
import { forgetProduct, recordProduct } from './product-record.mjs';
import { endNodeChildren } from './node-child.mjs';
import { ensureBuild } from './build.mjs';
import { ensurePackages } from './node-packages.mjs';
import { ensurePostgres } from './postgres.mjs';
import { Failure } from './failure.mjs';
import { logFile } from './places.mjs';
import { removeServerFile, writeServerFile } from './server-file.mjs';
import { runScriptOrFail } from './run-node.mjs';
import { say, seconds, step } from './say.mjs';
import { startProcesses } from './product-processes.mjs';
import { watchPostgres } from './watch-postgres.mjs';
import { webAnswers } from './web-answer.mjs';
import { webPort } from './web-port.mjs';

const modes = {
  start: { nextCommand: 'start', nodeEnv: 'production' },
  dev: { nextCommand: 'dev', nodeEnv: 'development' },
};

/** The product from nothing to answering; `stop` undoes it at any moment, also half-way. */
export function product(modeName, onLost) {
  const mode = modes[modeName];
  const parts = { postgres: undefined, processes: undefined, facts: undefined, stopping: false, endWatch: () => {} };

  const workerPids = () => parts.processes.workers.map((worker) => worker.pid).filter(Boolean);

  function stage(describe, action) {
    if (parts.stopping) throw new Failure('Stopped before it was ready.');
    return step(describe, action);
  }

  function keepRecords() {
    if (!parts.processes || parts.stopping) return;
    recordProduct([parts.processes.web.pid, ...workerPids()].filter(Boolean));
    if (parts.facts) writeServerFile({ ...parts.facts, workerPids: workerPids() });
  }

  async function start() {
    const sinceMs = performance.now();
    checkProductionEnvironment();
    recordProduct([]);
    await stage((worked) => (worked ? 'Packages installed' : 'Packages are in place'), ensurePackages);
    parts.postgres = ensurePostgres();
    const { databaseUrl } = await stage(describeDatabase, () => parts.postgres);
    parts.endWatch = watchPostgres(databaseUrl, onLost);
    const port = await webPort();
    const url = `http://localhost:${port}`;
    const env = { ...childEnvironment({ databaseUrl, url, nodeEnv: mode.nodeEnv }), PORT: String(port) };
    await stage('Database schema is current', () => migrate(env));
    if (modeName === 'start')
      await stage((worked) => (worked ? 'Web application built' : 'Build is current'), ensureBuild);
    else await bundleThread();
    await stage('Web and worker are running', () => bringUp(port, url, env));
    const demo =
      env.CHAFFLINE_DEMO === '1' ? await stage('Demonstration data is in place', () => seed(env)) : undefined;
    parts.facts = { url, pid: process.pid, workerPids: workerPids(), databaseUrl, ...demo };
    keepRecords();
    say(`Ready at ${url} (${seconds(sinceMs)})`);
    if (demo) await showDemo(demo, env);
    say('Ctrl-C stops it.');
  }

  async function bringUp(port, url, env) {
    const toTerminal = isProduction() || modeName === 'dev';
    parts.processes = startProcesses({ nextCommand: mode.nextCommand, port, env, toTerminal, onChange: keepRecords });
    keepRecords();
    await webAnswers(parts.processes.web, url, toTerminal ? undefined : logFile('web'));
  }

  async function stop() {
    parts.stopping = true;
    parts.endWatch();
    removeServerFile();
    endNodeChildren();
    const { web, workers } = parts.processes ?? { workers: [] };
    await Promise.all([web, ...workers].filter(Boolean).map((part) => part.stop()));
    const postgres = await parts.postgres?.catch(() => undefined); // why it failed was reported where it was awaited
    await postgres?.stop();
    forgetProduct();
  }

  return { start, stop };
}

const migrate = (env) =>
  runScriptOrFail('The database schema could not be brought up to date', 'src/ops/migrate.ts', {
    env,
    log: logFile('migrate'),
  });

function describeDatabase({ startedHere }) {
  if (process.env.DATABASE_URL) return 'Using the database of DATABASE_URL';
  return startedHere ? 'PostgreSQL started' : 'PostgreSQL is running';
}

async function seed(env) {
  await runScriptOrFail('The demonstration data could not be made', 'src/ops/seed.ts', { env, log: logFile('seed') });
  return demoAccounts();
}

async function showDemo(demo, env) {
  say('Sign in as');
  sayDemoAccounts(demo);
  await runScriptOrFail('The demonstration run did not finish', 'src/ops/demo-answer.ts', { env });
}
