import { Failure } from './failure.mjs';
import { pause } from './wait-until.mjs';

const [limitMs, deathsThatEndIt] = [120_000, 3];

async function answers(url) {
  try {
    return (await fetch(url, { signal: AbortSignal.timeout(30_000) })).ok;
  } catch {
    return false; // not listening yet
  }
}

/** Waits until the web process says that it can serve people. */
export async function webAnswers(web, url, log) {
  const deadline = performance.now() + limitMs;
  while (!(await answers(`${url}/health/ready`))) {
    if (web.deaths >= deathsThatEndIt) throw new Failure('The web process does not stay alive.', log);
    if (performance.now() > deadline) throw new Failure(`The web process does not answer at ${url}.`, log);
    await pause(100);
  }
}
