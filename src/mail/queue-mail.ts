import type { EntityManager } from '@mikro-orm/postgresql';
import { Mail } from '@/entities';
import { enqueue, queues } from '@/src/queue';
import { messages, type MessageData, type MessageKind } from './messages';
import { render } from './render';

type Wanted<Kind extends MessageKind> = {
  kind: Kind;
  to: string;
  data: MessageData[Kind];
  /** What this message is the one of: asking for it again sends nothing more. */
  dedupeKey: string;
};

/** Writes a message in the transaction of its reason; the worker sends it, once. */
export async function queueMail<Kind extends MessageKind>(
  tx: EntityManager,
  { kind, to, data, dedupeKey }: Wanted<Kind>,
): Promise<void> {
  if (await tx.findOne(Mail, { dedupeKey })) return;
  const mail = tx.create(Mail, { kind, toAddress: to, dedupeKey, status: 'queued', ...render(messages[kind](data)) });
  await tx.flush();
  await enqueue(tx, queues.sendMail, mail.id);
}
