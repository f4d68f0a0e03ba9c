import type { EntityManager } from '@mikro-orm/postgresql';
import { Mail } from '@/entities';
import { notFound } from '@/src/errors';

export type OutboxItem = {
  id: string;
  to: string;
  subject: string;
  text: string;
  status: Mail['status'];
  createdAt: string;
};

const shown = 50;

/** The newest messages, for the demonstration alone: there nothing is delivered, and links must be found somewhere. */
export async function outbox(em: EntityManager, isDemo: boolean): Promise<OutboxItem[]> {
  if (!isDemo) throw notFound('page');
  const rows = await em.find(Mail, {}, { orderBy: { createdAt: 'desc', id: 'desc' }, limit: shown });
  return rows.map(({ id, toAddress, subject, text, status, createdAt }) => ({
    id,
    to: toAddress,
    subject,
    text,
    status,
    createdAt: createdAt.toISOString(),
  }));
}
