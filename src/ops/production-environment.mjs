import { Failure } from './failure.mjs';
import { isProduction } from './child-environment.mjs';

/** With a database of one's own, addresses and secret have to be given too: several machines must agree on them. */
export function checkProductionEnvironment(env = process.env) {
  if (!isProduction(env)) return;
  const missing = ['PUBLIC_URL', 'CHAFFLINE_SECRET'].filter((name) => !env[name]);
  if (missing.length > 0) {
    throw new Failure(
      `DATABASE_URL is set, so ${missing.join(' and ')} must be set too (or CHAFFLINE_DEMO=1 for a demonstration on that database).`,
    );
  }
}
