import { supervise } from './supervise.mjs';
import { openProcessLog } from './process-log.mjs';

const workerNiceness = 7; // a computation must not make the pages slow

function workerCount() {
  const asked = Number(process.env.CHAFFLINE_WORKERS ?? 1);
  return Number.isInteger(asked) && asked >= 0 && asked <= 64 ? asked : 1;
}

const nextProgram = 'node_modules/next/dist/bin/next';

export function startProcesses({ nextCommand, port, env, toTerminal, onChange }) {
  const outOf = (name) => (toTerminal ? 'inherit' : openProcessLog(name));
  const host = process.env.CHAFFLINE_HOST ?? '127.0.0.1';
  const web = supervise({
    name: 'web process',
    args: [nextProgram, nextCommand, '-H', host, '-p', String(port)],
    out: outOf('web'),
    env,
    onChange,
  });
  const workerOut = outOf('worker');
  const workers = Array.from({ length: workerCount() }, () =>
    supervise({
      name: 'worker',
      args: ['--import', 'tsx', 'src/worker/main.ts'],
      out: workerOut,
      env,
      niceness: workerNiceness,
      onChange,
    }),
  );
  return { web, workers };
}
