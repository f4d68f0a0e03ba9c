'use client';

import { useId } from 'react';

type Props<Value extends string> = {
  legend: string;
  value: Value;
  onChange: (value: Value) => void;
  choices: readonly { value: Value; label: string; hint?: string }[];
};

/** A few alternatives that should all be seen. */
export function RunChoiceField<Value extends string>({ legend, value, onChange, choices }: Props<Value>) {
  const name = useId();
  return (
    <fieldset>
      <legend className="mb-1 text-sm font-medium">{legend}</legend>
      <div className="flex flex-wrap gap-2">
        {choices.map((choice) => (
          <label
            key={choice.value}
            className="border-field bg-panel has-checked:border-chaff has-checked:bg-chaff/15 has-focus-visible:outline-chaff flex min-h-10 cursor-pointer items-center gap-2 rounded-md border px-3 py-1.5 text-sm has-focus-visible:outline-2 has-focus-visible:outline-offset-2"
          >
            <input
              type="radio"
              name={name}
              value={choice.value}
              checked={value === choice.value}
              onChange={() => onChange(choice.value)}
              className="accent-chaff size-4 shrink-0"
            />
            <span>
              {choice.label}
              {choice.hint && <span className="text-muted block text-xs">{choice.hint}</span>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
