'use client';

import { weights, weightWords, type Weight } from './weights';

export function WeightSwitch({ value, onChange }: { value: Weight; onChange: (weight: Weight) => void }) {
  return (
    <fieldset className="border-line inline-flex rounded-md border p-0.5 text-sm">
      <legend className="sr-only">Weigh grains by</legend>
      {weights.map((weight) => (
        <label
          key={weight}
          className="has-checked:bg-ink has-checked:text-paper has-focus-visible:outline-chaff cursor-pointer rounded px-3 py-1 has-focus-visible:outline-2"
        >
          <input
            type="radio"
            name="weight"
            value={weight}
            checked={value === weight}
            onChange={() => onChange(weight)}
            className="sr-only"
          />
          {weightWords[weight]}
        </label>
      ))}
    </fieldset>
  );
}
