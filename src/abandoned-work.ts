import type { EntityManager } from '@mikro-orm/postgresql';
import { staleAfterS } from './claim';
import { enqueue, queues, type QueueName } from './queue';

const abandoned: Record<QueueName, string> = {
  [queues.importCatalogue]: `select id from catalogue t
    where status = 'checking' and coalesce(heartbeat_at, created_at) < now() - make_interval(secs => ?)`,
  [queues.executeRun]: `select id from run t
    where status in ('queued', 'running') and coalesce(heartbeat_at, created_at) < now() - make_interval(secs => ?)`,
  [queues.sendMail]: `select id from mail t
    where status in ('queued', 'sending') and coalesce(heartbeat_at, created_at) < now() - make_interval(secs => ?)`,
};

/** Sends again what shows no sign of life and is not waiting in the queue either. Says how many there were. */
export async function sendAbandonedWork(em: EntityManager): Promise<number> {
  return em.transactional(async (tx) => {
    let sent = 0;
    for (const [queue, select] of Object.entries(abandoned) as [QueueName, string][]) {
      const rows = await tx.execute<{ id: string }[]>(
        `${select} and not exists (
           select 1 from pgboss.job j where j.name = ? and j.state in ('created', 'retry') and j.data->>'id' = t.id::text
         ) for update skip locked`,
        [staleAfterS, queue],
      );
      for (const { id } of rows) await enqueue(tx, queue, id);
      sent += rows.length;
    }
    return sent;
  });
}
