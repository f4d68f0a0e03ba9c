import type { Metadata } from 'next';
import Link from 'next/link';
import { outbox } from '@/src/mail/outbox';
import { env } from '@/src/env';
import { Moment } from '@/src/ui/run-moment';
import { Wordmark } from '@/src/ui/wordmark';
import { orNotFound, pageEm } from '@/src/web/page';

export const metadata: Metadata = { title: 'Outbox', robots: 'noindex' };

const link = /(https?:\/\/\S+)/;

/** What would have been sent, in the demonstration alone. */
export default async function OutboxPage() {
  const items = await orNotFound(outbox(await pageEm(), env().CHAFFLINE_DEMO === '1'));
  return (
    <main id="content" className="mx-auto grid max-w-3xl gap-8 px-5 py-8">
      <Link href="/" aria-label="Chaffline, front page">
        <Wordmark />
      </Link>
      <div>
        <h1 className="text-3xl">Outbox of the demonstration</h1>
        <p className="text-muted mt-2">
          No message leaves this machine: here is what would have been sent, newest first.
        </p>
      </div>
      {items.length === 0 && <p className="text-muted">No messages yet.</p>}
      {items.map(({ id, to, subject, text, status, createdAt }) => (
        <article key={id} className="border-line bg-panel grid gap-2 rounded-lg border p-5" aria-labelledby={id}>
          <h2 id={id} className="text-xl">
            {subject}
          </h2>
          <p className="text-muted text-sm">
            To {to}, {status}, <Moment iso={createdAt} />
          </p>
          {text.split('\n\n').map((paragraph, index) => (
            <p key={index} className="break-words">
              {paragraph.split(link).map((part, at) =>
                link.test(part) ? (
                  <a key={at} href={part} className="prose-link">
                    {part}
                  </a>
                ) : (
                  part
                ),
              )}
            </p>
          ))}
        </article>
      ))}
    </main>
  );
}
