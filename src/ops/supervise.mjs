import { lowerSessionPriority } from './background-priority.mjs';
import { nextPauseMs } from './backoff.mjs';
import { pause } from './wait-until.mjs';
import { say } from './say.mjs';
import { spawnNode } from './node-child.mjs';

const graceMs = 8_000;

function killGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * Keeps one Node process running until `stop`. It has its own process group: Ctrl-C reaches only us, we end it in order.
 * `onChange` is called whenever there is a new process or one less.
 */
export function supervise({ name, args, onChange = () => {}, ...options }) {
  const state = { child: undefined, deaths: 0, stopping: false, pauseMs: undefined };

  async function keepRunning() {
    while (!state.stopping) {
      const bornMs = performance.now();
      const child = spawnNode(args, { ...options, detached: true });
      state.child = child;
      const ended = new Promise((done) => {
        child.once('error', (error) => done(error.message));
        child.once('exit', (code, signal) => done(signal ?? `code ${code}`));
      });
      if (options.niceness) void lowerSessionPriority(child.pid, options.niceness);
      onChange();
      const how = await ended;
      if (child.pid) killGroup(child.pid, 'SIGKILL'); // what it may have started itself
      state.child = undefined;
      state.deaths += 1;
      onChange();
      if (state.stopping) return;
      state.pauseMs = nextPauseMs(state.pauseMs, performance.now() - bornMs);
      say(`The ${name} ended (${how}) and is started again`);
      await pause(state.pauseMs);
    }
  }

  const running = keepRunning();

  return {
    name,
    get pid() {
      return state.child?.pid;
    },
    get deaths() {
      return state.deaths;
    },
    async stop() {
      state.stopping = true;
      const pid = state.child?.pid;
      if (pid === undefined) return;
      killGroup(pid, 'SIGTERM');
      const force = setTimeout(() => killGroup(pid, 'SIGKILL'), graceMs);
      await running;
      clearTimeout(force);
    },
  };
}
