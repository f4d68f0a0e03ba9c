'use client';

import { useState } from 'react';
import { FormField } from './form-field';

type Props = { name?: string; label?: string; autoComplete: string; hint?: string; problem?: string };

export function PasswordField({ name = 'password', label = 'Password', ...rest }: Props) {
  const [isShown, setIsShown] = useState(false);
  return (
    <div className="grid gap-2">
      <FormField name={name} label={label} type={isShown ? 'text' : 'password'} required {...rest} />
      <label className="text-muted flex items-center gap-2 text-sm">
        <input
          type="checkbox"
          checked={isShown}
          onChange={(event) => setIsShown(event.target.checked)}
          className="accent-chaff size-4"
        />
        Show the password
      </label>
    </div>
  );
}
