import { createServer } from 'node:net';
import { checkoutId } from './places.mjs';
import { pause } from './wait-until.mjs';

/**
 * A lock that cannot be left behind: an abstract Unix socket, which the kernel frees with its process however that ends.
 * Answers a function that frees it, or undefined when another process holds it.
 */
export function tryLock(name) {
  return new Promise((done, fail) => {
    const server = createServer((connection) => connection.destroy());
    server.once('error', (error) => (error.code === 'EADDRINUSE' ? done(undefined) : fail(error)));
    server.listen(`\0chaffline-${checkoutId}-${name}`, () => {
      server.unref();
      done(() => new Promise((closed) => server.close(closed)));
    });
  });
}

const worthTellingMs = 1_000;

/** One process of this checkout at a time; the others wait their turn, and `onWait` hears of a long one. */
export async function exclusively(name, action, onWait = () => {}) {
  const waiting = setTimeout(onWait, worthTellingMs);
  let release = await tryLock(name);
  while (!release) {
    await pause(50);
    release = await tryLock(name);
  }
  clearTimeout(waiting);
  try {
    return await action();
  } finally {
    await release();
  }
}
