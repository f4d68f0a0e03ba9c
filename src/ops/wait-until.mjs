export const pause = (ms) => new Promise((done) => setTimeout(done, ms));

/** The first truthy answer of `probe`, or undefined when there was none in time. */
export async function waitUntil(probe, { withinMs, everyMs = 50 }) {
  const deadline = performance.now() + withinMs;
  for (;;) {
    const answer = await probe();
    if (answer) return answer;
    if (performance.now() >= deadline) return undefined;
    await pause(everyMs);
  }
}
