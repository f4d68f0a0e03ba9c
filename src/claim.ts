import { randomUUID } from 'node:crypto';

/** Without a sign of life for this long, the work is taken to be abandoned and goes to the next worker. */
export const staleAfterS = 10;
const beatEveryMs = 1000;

export const newClaim = (): string => randomUUID();

/** Another worker took the work over, or it was cancelled: what this one did is rolled back. */
export class ClaimLost extends Error {
  constructor() {
    super('The claim on this work was lost.');
    this.name = 'ClaimLost';
  }
}

/** Says every second that the work goes on; when that is refused, the signal ends the work. */
export async function whileBeating<T>(
  beat: () => Promise<boolean>,
  work: (signal: AbortSignal) => Promise<T>,
): Promise<T> {
  const lost = new AbortController();
  let beating: Promise<void> | undefined;
  const timer = setInterval(() => {
    beating ??= beatOnce().finally(() => (beating = undefined));
  }, beatEveryMs);
  // A beat that fails for once (the database restarts) is tried again; the claim itself decides at the end.
  const beatOnce = () =>
    beat().then(
      (held) => (held ? undefined : lost.abort(new ClaimLost())),
      () => undefined,
    );
  try {
    return await work(lost.signal);
  } finally {
    clearInterval(timer);
    await beating;
  }
}

/** Lets timers and sockets have their turn inside a long computation. */
export const breathe = () => new Promise<void>((resume) => setImmediate(resume));
