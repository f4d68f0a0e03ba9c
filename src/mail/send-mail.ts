import type { EntityManager } from '@mikro-orm/postgresql';
import { Mail } from '@/entities';
import { deliver } from './mail-service';

const mostAttempts = 8;
/** Longer than a try takes; a worker that was killed in the middle is replaced after it. */
const busyForS = 60;

/** The job: takes the message, hands it over, says so. What fails is tried again by the sweeper, at growing distances. */
export async function sendMail(em: EntityManager, id: string): Promise<void> {
  const [taken] = await em.getConnection().execute<{ attempts: number }[]>(
    `update mail set status = 'sending', attempts = attempts + 1, heartbeat_at = now() + make_interval(secs => ?)
     where id = ? and (status = 'queued' or (status = 'sending' and heartbeat_at < now())) and coalesce(heartbeat_at, created_at) <= now()
     returning attempts`,
    [busyForS, id],
  );
  if (!taken) return;
  const mail = await em.findOneOrFail(Mail, { id }, { refresh: true });
  try {
    await deliver(mail);
  } catch (error) {
    await postpone(em, id, taken.attempts);
    throw error;
  }
  await em.nativeUpdate(Mail, { id }, { status: 'sent', sentAt: new Date() });
}

async function postpone(em: EntityManager, id: string, attempts: number): Promise<void> {
  if (attempts >= mostAttempts) {
    await em.nativeUpdate(Mail, { id }, { status: 'failed' });
    return;
  }
  const waitMs = Math.min(3600, 5 * 2 ** attempts) * 1000;
  await em.nativeUpdate(Mail, { id }, { status: 'queued', heartbeatAt: new Date(Date.now() + waitMs) });
}
