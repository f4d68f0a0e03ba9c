'use client';

import { Button } from '@/src/ui/button';
import { Wordmark } from '@/src/ui/wordmark';

export default function ErrorPage({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <main id="content" className="mx-auto grid max-w-xl gap-5 px-5 py-16">
      <Wordmark />
      <h1 className="text-3xl">Something went wrong on our side</h1>
      <p className="text-muted">
        What you stored is safe. Try again; if it stays, tell the administrator
        {error.digest ? ` the code ${error.digest}` : ''}.
      </p>
      <div>
        <Button variant="primary" onClick={reset}>
          Try again
        </Button>
      </div>
    </main>
  );
}
