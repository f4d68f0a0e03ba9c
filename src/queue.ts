import type { EntityManager } from '@mikro-orm/postgresql';
import type { ClientBase } from 'pg';
import PgBoss from 'pg-boss';

export const queues = {
  importCatalogue: 'import-catalogue',
  executeRun: 'execute-run',
  sendMail: 'send-mail',
} as const;
export type QueueName = (typeof queues)[keyof typeof queues];

/** The very connection of the open transaction: what is sent through it rolls back with it. Do not release it. */
export async function transactionClient(tx: EntityManager): Promise<ClientBase> {
  const context = tx.getTransactionContext();
  if (!context) throw new Error('transactionClient needs an open transaction');
  return (context as { client: { acquireConnection(): Promise<ClientBase> } }).client.acquireConnection();
}

/** A job exists exactly when the row that asked for it does: both stand in one transaction. */
export async function enqueue(tx: EntityManager, queue: QueueName, id: string): Promise<void> {
  const client = await transactionClient(tx);
  const executeSql = (sql: string, values: unknown[]) => client.query(sql, values);
  const boss = new PgBoss({ db: { executeSql } as PgBoss.Db, supervise: false, schedule: false, migrate: false });
  await boss.send(queue, { id });
}
