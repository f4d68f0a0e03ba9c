import { spawn } from 'node:child_process';
import { closeSync, openSync } from 'node:fs';
import { Failure } from './failure.mjs';

/** Ends with the command's exit code (128 + 15 after a signal we cannot name better); output goes to `log`, or to ours. */
export async function exitCodeOf(command, args, { log, ...options } = {}) {
  const out = log === undefined ? 'inherit' : openSync(log, 'a');
  try {
    return await new Promise((done, fail) => {
      const child = spawn(command, args, { stdio: ['ignore', out, out], ...options });
      child.once('error', fail);
      child.once('exit', (code) => done(code ?? 143));
    });
  } finally {
    if (log !== undefined) closeSync(out);
  }
}

/** Runs a command that has to succeed; `sentence` says what failed when it did not. */
export async function runOrFail(sentence, command, args, options = {}) {
  const code = await exitCodeOf(command, args, options).catch((error) => {
    if (error.code === 'ENOENT') return 127;
    throw error;
  });
  if (code !== 0) throw new Failure(`${sentence} (${command} ended with ${code}).`, options.log);
}
