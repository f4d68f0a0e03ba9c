import { MikroORM } from '@mikro-orm/postgresql';
import PgBoss from 'pg-boss';
import { shippedMaterials } from '@/fixtures/materials/library';
import { starPresets } from '@/fixtures/stars';
import { ormConfig } from '@/mikro-orm.config';
import { BadEnvironment, env } from '@/src/env';
import { publishShippedMaterials } from '@/src/materials/publish-library';
import { queues } from '@/src/queue';
import { publishShippedStars } from '@/src/stars/publish-presets';

/** Brings tables, job queues and the shipped presets up to date; does nothing when they are. */
export async function migrate(databaseUrl: string): Promise<void> {
  const orm = await MikroORM.init(ormConfig(databaseUrl));
  try {
    await orm.getMigrator().up();
    await publishShippedStars(orm.em.fork(), starPresets);
    await publishShippedMaterials(orm.em.fork(), shippedMaterials());
  } finally {
    await orm.close(true);
  }
  const boss = new PgBoss({ connectionString: databaseUrl, supervise: false, schedule: false });
  boss.on('error', () => undefined);
  await boss.start();
  try {
    // What a killed worker left behind is found by the rows' heartbeats, so the queue itself need not try again.
    for (const name of Object.values(queues)) {
      const options = { name, retryLimit: 0, expireInHours: 23 };
      if (!(await boss.getQueue(name))) await boss.createQueue(name, options);
    }
  } finally {
    await boss.stop({ graceful: false, wait: true });
  }
}

const startedAsScript = process.argv[1]?.endsWith('migrate.ts');
if (startedAsScript) {
  try {
    await migrate(env().DATABASE_URL);
  } catch (error) {
    console.error(sentenceOf(error));
    process.exit(1);
  }
}

/** For the person at the keyboard: what is wrong, without a stack where it is not ours to mend. */
function sentenceOf(error: unknown): unknown {
  if (error instanceof BadEnvironment) return error.message;
  const reason = error instanceof Error && 'code' in error ? String(error.code) : '';
  const { host } = new URL(env().DATABASE_URL);
  if (/^(ECONNREFUSED|ENOTFOUND|ETIMEDOUT|EHOSTUNREACH)$/.test(reason))
    return `No PostgreSQL answers at ${host} (${reason}).`;
  if (/^(28P01|28000|3D000|42501)$/.test(reason)) return `PostgreSQL at ${host} refused: ${(error as Error).message}.`;
  return error;
}
