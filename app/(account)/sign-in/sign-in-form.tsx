'use client';

import Link from 'next/link';
import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { PasswordField } from '@/src/ui/password-field';
import { signInAction } from './actions';

export function SignInForm({ next }: { next: string }) {
  const [state, send, isSending] = useActionState(signInAction, {});
  return (
    <form action={send} className="grid gap-5">
      <input type="hidden" name="next" value={next} />
      <div aria-live="polite">{state.message && <Notice kind="danger">{state.message}</Notice>}</div>
      <FormField
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        required
        defaultValue={state.values?.email}
        problem={state.problems?.email}
      />
      <PasswordField autoComplete="current-password" problem={state.problems?.password} />
      <Button type="submit" variant="primary" disabled={isSending}>
        {isSending ? 'Signing in ...' : 'Sign in'}
      </Button>
      <p className="text-muted text-sm">
        <Link href="/forgotten" className="prose-link">
          Forgotten the password?
        </Link>
      </p>
      <p className="text-muted text-sm">
        No account yet?{' '}
        <Link href="/sign-up" className="prose-link">
          Sign up and start a group
        </Link>
      </p>
    </form>
  );
}
