import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment } from './columns';

export const mailStatuses = ['queued', 'sending', 'sent', 'failed'] as const;

/** A message as it goes out, written in the transaction that gives the reason for it. */
export const Mail = defineEntity({
  name: 'Mail',
  tableName: 'mail',
  properties: {
    id: id(),
    kind: p.string().length(40),
    toAddress: p.string().length(254),
    subject: p.string().length(300),
    text: p.text(),
    html: p.text(),
    dedupeKey: p.string().length(200).unique(),
    status: p.enum([...mailStatuses]),
    attempts: p.integer().default(0),
    heartbeatAt: moment().nullable(),
    createdAt: createdAt(),
    sentAt: moment().nullable(),
  },
  indexes: [{ name: 'mail_by_time', properties: ['createdAt', 'id'] }],
});
export type Mail = InferEntity<typeof Mail>;
