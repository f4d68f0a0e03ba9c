import { closeSync, openSync, readFileSync } from 'node:fs';
import { constants } from 'node:os';
import { Failure } from './failure.mjs';
import { spawnNode } from './node-child.mjs';

/** The exit code of a Node program; after a signal the one that shells give. */
export async function nodeExitCode(args, { log, ...options } = {}) {
  const out = log === undefined ? (options.out ?? 'inherit') : openSync(log, 'w');
  try {
    return await new Promise((done, fail) => {
      const child = spawnNode(args, { ...options, out });
      child.once('error', fail);
      child.once('exit', (code, signal) => done(code ?? 128 + constants.signals[signal]));
    });
  } finally {
    if (log !== undefined) closeSync(out);
  }
}

const mostWords = 6;

/** What a program said last, without the stack of calls below it. */
function lastWords(log) {
  const lines = readFileSync(log, 'utf8').trimEnd().split('\n');
  return lines
    .filter((line) => !/^\s+at |^Node\.js v/.test(line))
    .slice(-mostWords)
    .join('\n');
}

export async function runNodeOrFail(sentence, args, options = {}) {
  const code = await nodeExitCode(args, options);
  if (code === 0) return;
  const said = options.log === undefined ? '' : lastWords(options.log);
  throw new Failure([`${sentence} (it ended with ${code}).`, said].filter(Boolean).join('\n'), options.log);
}

/** A TypeScript program of the product, run outside Next. */
export const runScriptOrFail = (sentence, script, options) =>
  runNodeOrFail(sentence, ['--import', 'tsx', script], options);
