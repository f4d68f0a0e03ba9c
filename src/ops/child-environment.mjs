import { inLocal } from './places.mjs';
import { keptSecret } from './kept-secret.mjs';
import { runningServerFile } from './server-file.mjs';

/** True when somebody else runs the database and the addresses: nothing local is made and no demo is put there. */
export const isProduction = (env = process.env) => Boolean(env.DATABASE_URL) && env.CHAFFLINE_DEMO !== '1';

/** What every process of the product is told; values that the caller's environment gives win. */
export function childEnvironment({ databaseUrl, url, nodeEnv = 'production' }) {
  const address = process.env.PUBLIC_URL ?? url ?? runningServerFile()?.url;
  return {
    ...process.env,
    NODE_ENV: nodeEnv,
    NEXT_TELEMETRY_DISABLED: '1',
    DATABASE_URL: databaseUrl,
    CHAFFLINE_SECRET: process.env.CHAFFLINE_SECRET ?? keptSecret(inLocal('secret')),
    CHAFFLINE_DEMO: process.env.CHAFFLINE_DEMO ?? (isProduction() ? '0' : '1'),
    ...(address ? { PUBLIC_URL: address } : {}),
  };
}
