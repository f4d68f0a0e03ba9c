import { Resend } from 'resend';
import type { Mail } from '@/entities';
import { env } from '@/src/env';
import { startLocalService } from './local-service';

let service: Promise<Resend> | undefined;

async function connect(): Promise<Resend> {
  const { RESEND_API_KEY, RESEND_BASE_URL } = env();
  if (RESEND_API_KEY) return new Resend(RESEND_API_KEY, RESEND_BASE_URL ? { baseUrl: RESEND_BASE_URL } : {});
  return new Resend('re_local', { baseUrl: await startLocalService() });
}

/** Hands a message to the service. The same id is taken once, so sending again after a kill does no harm. */
export async function deliver(mail: Mail): Promise<void> {
  service ??= connect();
  const { toAddress, subject, text, html, id } = mail;
  const message = { from: env().MAIL_FROM, to: toAddress, subject, text, html };
  const { error } = await (await service).emails.send(message, { idempotencyKey: id });
  if (error) throw new Error(`the mail service refused message ${id}: ${error.name} ${error.message}`);
}
