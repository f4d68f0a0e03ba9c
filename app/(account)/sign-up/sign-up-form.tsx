'use client';

import Link from 'next/link';
import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { PasswordField } from '@/src/ui/password-field';
import { signUpAction } from './actions';

export function SignUpForm() {
  const [{ message, problems, values }, send, isSending] = useActionState(signUpAction, {});
  return (
    <form action={send} className="grid gap-5">
      <div aria-live="polite">{message && <Notice kind="danger">{message}</Notice>}</div>
      <FormField
        name="name"
        label="Your name"
        autoComplete="name"
        required
        defaultValue={values?.name}
        problem={problems?.name}
      />
      <FormField
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        required
        defaultValue={values?.email}
        problem={problems?.email}
      />
      <PasswordField
        autoComplete="new-password"
        hint="At least 12 characters: a short sentence works well."
        problem={problems?.password}
      />
      <FormField
        name="groupName"
        label="Name of your group"
        hint="You become its principal investigator. Catalogues and runs belong to the group."
        required
        defaultValue={values?.groupName}
        problem={problems?.groupName}
      />
      <Button type="submit" variant="primary" disabled={isSending}>
        {isSending ? 'Creating the account ...' : 'Create the account'}
      </Button>
      <p className="text-muted text-sm">
        Already have one?{' '}
        <Link href="/sign-in" className="prose-link">
          Sign in
        </Link>
      </p>
    </form>
  );
}
