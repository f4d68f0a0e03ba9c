import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { Mail } from '@/entities';
import { sendAbandonedWork } from '@/src/abandoned-work';
import { forkEm } from '@/src/db';
import { messages } from '@/src/mail/messages';
import { queueMail } from '@/src/mail/queue-mail';
import { outbox } from '@/src/mail/outbox';
import { render } from '@/src/mail/render';
import { sendMail } from '@/src/mail/send-mail';
import { withOwnDatabase } from './own-database';

withOwnDatabase();

type Taken = { key: string; body: { to: string; subject: string } };
const taken: Taken[] = [];
let fails = 0;
let service: Server;

/** The mail service's address, answered by this test: what its SDK sends is what counts. */
beforeAll(async () => {
  service = createServer((request, response) => {
    const pieces: Buffer[] = [];
    request.on('data', (piece: Buffer) => pieces.push(piece));
    request.on('end', () => {
      const isFailing = fails > 0;
      fails -= 1;
      if (!isFailing)
        taken.push({
          key: String(request.headers['idempotency-key']),
          body: JSON.parse(Buffer.concat(pieces).toString()) as Taken['body'],
        });
      response.writeHead(isFailing ? 500 : 200, { 'content-type': 'application/json' });
      response.end(JSON.stringify(isFailing ? { name: 'application_error', message: 'down' } : { id: 'x' }));
    });
  });
  await new Promise<void>((ready) => service.listen(0, '127.0.0.1', ready));
  process.env.RESEND_API_KEY = 're_test';
  process.env.RESEND_BASE_URL = `http://127.0.0.1:${(service.address() as AddressInfo).port}`;
});
afterAll(() => service.close());

const queued = async (dedupeKey: string, name = 'Someone') => {
  const em = await forkEm();
  await em.transactional((tx) =>
    queueMail(tx, { kind: 'passwordChanged', to: 'someone@example.org', data: { name }, dedupeKey }),
  );
  return (await forkEm()).findOneOrFail(Mail, { dedupeKey });
};

describe('a message', () => {
  test('is sent once, however often it is asked for and tried', async () => {
    const { id } = await queued('once');
    await queued('once');
    await Promise.all([1, 2, 3].map(async () => sendMail(await forkEm(), id)));
    await sendMail(await forkEm(), id);
    expect(taken.filter(({ key }) => key === id)).toHaveLength(1);
    expect(await (await forkEm()).findOneOrFail(Mail, { id })).toMatchObject({ status: 'sent', attempts: 1 });
  });

  test('that the service refuses waits and goes out later', async () => {
    const { id } = await queued('later');
    fails = 1;
    await expect(sendMail(await forkEm(), id)).rejects.toThrow(/refused/);
    await sendMail(await forkEm(), id);
    expect(await (await forkEm()).findOneOrFail(Mail, { id })).toMatchObject({ status: 'queued', attempts: 1 });
    await (await forkEm()).nativeUpdate(Mail, { id }, { heartbeatAt: new Date(Date.now() - 60_000) });
    expect(await sendAbandonedWork(await forkEm())).toBeGreaterThanOrEqual(0);
    await sendMail(await forkEm(), id);
    expect(await (await forkEm()).findOneOrFail(Mail, { id })).toMatchObject({ status: 'sent', attempts: 2 });
  });

  test('does not exist when its reason is rolled back', async () => {
    const em = await forkEm();
    const failed = em.transactional(async (tx) => {
      await queueMail(tx, { kind: 'passwordChanged', to: 'x@example.org', data: { name: 'X' }, dedupeKey: 'never' });
      throw new Error('rolled back');
    });
    await expect(failed).rejects.toThrow('rolled back');
    expect(await (await forkEm()).count(Mail, { dedupeKey: 'never' })).toBe(0);
  });

  test('ASVS 1.3.11: names cannot alter its headers, nor its HTML', () => {
    const data = {
      groupName: 'A\r\nBcc: all@example.org',
      inviterName: '<script>alert(1)</script>',
      role: 'student',
      link: 'http://localhost/"x',
      until: '2026-12-15',
    };
    const { subject, html, text } = render(messages.invitation(data));
    expect(subject).not.toMatch(/[\r\n]/);
    expect(html).not.toContain('<script>');
    expect(html).toContain('&lt;script&gt;');
    expect(html).toContain('href="http://localhost/&quot;x"');
    expect(text).toContain('http://localhost/"x');
    expect(html).not.toMatch(/<img|src=/);
  });
});

test('the outbox is for the demonstration alone', async () => {
  await expect(outbox(await forkEm(), false)).rejects.toMatchObject({ kind: 'notFound' });
  expect((await outbox(await forkEm(), true)).length).toBeGreaterThan(0);
});
