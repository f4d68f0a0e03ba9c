import { forkEm } from '@/src/db';
import { log } from '@/src/log';
import { sendAbandonedWork } from '@/src/abandoned-work';

const everyMs = 2000;

/** Work whose worker was killed is sent again; the claim on the row lets one worker have it. */
export function startSweeping(): () => void {
  let sweeping = false;
  const timer = setInterval(() => {
    if (sweeping) return;
    sweeping = true;
    forkEm()
      .then(sendAbandonedWork)
      .then((sent) => sent > 0 && log.warn({ sent }, 'abandoned work was sent again'))
      .catch((error: unknown) => log.error({ err: error }, 'sweep failed'))
      .finally(() => (sweeping = false));
  }, everyMs);
  return () => clearInterval(timer);
}
