'use client';

import type { ReactNode } from 'react';

type Props = { label: string; hint: string; isOn: boolean; onChange: (isOn: boolean) => void; children: ReactNode };

/** An effect that is left out unless asked for; its numbers appear with it. */
export function RunToggleField({ label, hint, isOn, onChange, children }: Props) {
  return (
    <div className="grid gap-3">
      <label className="flex cursor-pointer items-start gap-3">
        <input
          type="checkbox"
          checked={isOn}
          onChange={(event) => onChange(event.target.checked)}
          className="accent-chaff mt-1 size-4 shrink-0"
        />
        <span className="text-sm">
          <span className="font-medium">{label}</span>
          <span className="text-muted block">{hint}</span>
        </span>
      </label>
      {isOn && <div className="grid gap-4 pl-7 sm:grid-cols-3">{children}</div>}
    </div>
  );
}
