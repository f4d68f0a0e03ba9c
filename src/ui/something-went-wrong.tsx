'use client';

import { Button } from './button';

export type ErrorPageProps = { error: Error & { digest?: string }; reset: () => void };

export function SomethingWentWrong({ error, reset }: ErrorPageProps) {
  return (
    <div className="grid gap-5" role="alert">
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
    </div>
  );
}
