let toStderr = false;

/** For commands whose standard output belongs to the script they run. */
export function sayOnStderr() {
  toStderr = true;
}

export function say(line) {
  (toStderr ? process.stderr : process.stdout).write(`${line}\n`);
}

export const seconds = (sinceMs) => `${((performance.now() - sinceMs) / 1000).toFixed(1)} s`;

/** Runs one step and reports it with its duration; `describe` turns the outcome into the words of the line. */
export async function step(describe, action) {
  const sinceMs = performance.now();
  const outcome = await action();
  say(`${typeof describe === 'string' ? describe : describe(outcome)} (${seconds(sinceMs)})`);
  return outcome;
}
