import PgBoss from 'pg-boss';
import { checkCatalogue } from '@/src/catalogues/check-catalogue';
import { closeOrm, forkEm, orm } from '@/src/db';
import { env } from '@/src/env';
import { log } from '@/src/log';
import { sendMail } from '@/src/mail/send-mail';
import { queues, type QueueName } from '@/src/queue';
import { executeRun } from '@/src/runs/execute-run';
import { closeThreads } from '@/src/runs/curve-threads';
import { startSweeping } from './sweep';

type Job = { id: string };

const { DATABASE_URL, CHAFFLINE_MAX_ROWS } = env();
await orm();
const boss = new PgBoss({ connectionString: DATABASE_URL, migrate: false, schedule: false, max: 3 });
boss.on('error', (error) => log.error({ err: error }, 'queue'));
await boss.start();

async function take(queue: QueueName, handle: (id: string) => Promise<void>): Promise<void> {
  await boss.work<Job>(queue, { batchSize: 1, pollingIntervalSeconds: 0.5 }, async ([job]) => {
    if (!job) return;
    const { id } = job.data;
    const started = performance.now();
    try {
      await handle(id);
      log.info({ queue, id, ms: Math.round(performance.now() - started) }, 'job done');
    } catch (error) {
      log.error({ err: error, queue, id }, 'job failed');
    }
  });
}

await take(queues.importCatalogue, async (id) => checkCatalogue(await forkEm(), id, { maxRows: CHAFFLINE_MAX_ROWS }));
await take(queues.executeRun, async (id) => executeRun(await forkEm(), id));
await take(queues.sendMail, async (id) => sendMail(await forkEm(), id));
const stopSweeping = startSweeping();
log.info('worker is ready');

async function stop(): Promise<void> {
  stopSweeping();
  await boss.stop({ graceful: false, wait: true });
  await closeThreads();
  await closeOrm();
  process.exit(0);
}

process.once('SIGTERM', () => void stop());
process.once('SIGINT', () => void stop());
