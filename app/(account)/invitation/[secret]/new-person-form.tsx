'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { PasswordField } from '@/src/ui/password-field';
import { acceptAsNewPersonAction } from './actions';

export function NewPersonForm({ secret, email }: { secret: string; email: string }) {
  const [{ message, problems, values }, send, isSending] = useActionState(acceptAsNewPersonAction, {});
  return (
    <form action={send} className="grid gap-5">
      <input type="hidden" name="secret" value={secret} />
      <div aria-live="polite">{message && <Notice kind="danger">{message}</Notice>}</div>
      <FormField
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        readOnly
        defaultValue={email}
      />
      <FormField
        name="name"
        label="Your name"
        autoComplete="name"
        required
        defaultValue={values?.name}
        problem={problems?.name}
      />
      <PasswordField
        autoComplete="new-password"
        hint="At least 12 characters: a short sentence works well."
        problem={problems?.password}
      />
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Create an account and join
        </Button>
      </div>
    </form>
  );
}
