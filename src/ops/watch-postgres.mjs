import { clusterDir } from './postgres-cluster.mjs';
import { ensurePostgres } from './postgres.mjs';
import { Failure } from './failure.mjs';
import { pause } from './wait-until.mjs';
import { runningServer } from './postgres-server.mjs';
import { say } from './say.mjs';

const everyMs = 1_000;

/**
 * Starts the server again when it dies under the running product. Answers a function that ends the watch.
 * `onLost` hears of a server that cannot be had again where the product looks for it.
 */
export function watchPostgres(databaseUrl, onLost) {
  if (process.env.DATABASE_URL) return () => {};
  let ended = false;
  const watch = async () => {
    while (!ended) {
      await pause(everyMs);
      if (ended || runningServer(clusterDir())) continue;
      say('PostgreSQL ended and is started again');
      const again = await ensurePostgres();
      if (again.databaseUrl !== databaseUrl) throw new Failure('PostgreSQL could not get its port again.');
    }
  };
  watch().catch((error) => {
    if (!ended) onLost(error);
  });
  return () => {
    ended = true;
  };
}
