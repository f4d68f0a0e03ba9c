import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import pg from 'pg';
import { Refusal } from '@/src/errors';
import { env } from '@/src/env';

/** What may be asked how often, per person (or per address where nobody is signed in). */
export const limits = {
  upload: { points: 120, durationS: 60 },
  run: { points: 600, durationS: 60 },
  curve: { points: 600, durationS: 60 },
  signInFailure: { points: 10, durationS: 900 },
  signUp: { points: 30, durationS: 3600 },
  accountMail: { points: 5, durationS: 900 },
  passphrase: { points: 10, durationS: 900 },
  tokens: { points: 60, durationS: 3600 },
  invitation: { points: 60, durationS: 3600 },
} as const;
export type LimitName = keyof typeof limits;

const held = globalThis as typeof globalThis & { chafflineLimitPool?: pg.Pool };

function limiter(name: LimitName): RateLimiterPostgres {
  held.chafflineLimitPool ??= new pg.Pool({ connectionString: env().DATABASE_URL, max: 3, allowExitOnIdle: true });
  return new RateLimiterPostgres({
    storeClient: held.chafflineLimitPool,
    tableName: 'rate_limit',
    tableCreated: true,
    keyPrefix: name,
    points: limits[name].points,
    duration: limits[name].durationS,
    clearExpiredByTimeout: false,
  });
}

export async function closeLimits(): Promise<void> {
  await held.chafflineLimitPool?.end();
  held.chafflineLimitPool = undefined;
}

/** Counts one; refuses when the count is above the limit. */
export async function countAgainst(name: LimitName, key: string): Promise<void> {
  try {
    await limiter(name).consume(key);
  } catch (error) {
    throw error instanceof RateLimiterRes ? tooMany(error.msBeforeNext) : error;
  }
}

/** Refuses when the limit is already reached, without counting. */
export async function refuseAbove(name: LimitName, key: string): Promise<void> {
  const seen = await limiter(name).get(key);
  if (seen && seen.consumedPoints >= limits[name].points) throw tooMany(seen.msBeforeNext);
}

function tooMany(msBeforeNext: number): Refusal {
  const seconds = Math.max(1, Math.ceil(msBeforeNext / 1000));
  return new Refusal('tooMany', `That was asked too often. Try again in ${seconds} s.`, [], seconds);
}

/** Counts only when the work is refused: who signs in rightly is never slowed down. */
export async function countFailure<T>(name: LimitName, key: string, work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (error instanceof Refusal) await countAgainst(name, key);
    throw error;
  }
}
