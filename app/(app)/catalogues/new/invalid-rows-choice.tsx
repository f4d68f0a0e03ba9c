'use client';

export type InvalidRows = 'refuse' | 'leaveOut';

const choices: { value: InvalidRows; label: string; hint: string }[] = [
  {
    value: 'refuse',
    label: 'Refuse the catalogue',
    hint: 'You get the list of bad rows, correct the file and upload it again.',
  },
  {
    value: 'leaveOut',
    label: 'Leave them out',
    hint: 'The good rows become the catalogue; the list of bad rows stays with it.',
  },
];

export function InvalidRowsChoice({ value, onChange }: { value: InvalidRows; onChange: (value: InvalidRows) => void }) {
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-2 font-medium">If some rows are not valid</legend>
      {choices.map((choice) => (
        <label key={choice.value} className="flex items-start gap-3">
          <input
            type="radio"
            name="onInvalidRows"
            value={choice.value}
            checked={value === choice.value}
            onChange={() => onChange(choice.value)}
            className="accent-chaff mt-1 size-4"
          />
          <span>
            {choice.label}
            <span className="text-muted block text-sm">{choice.hint}</span>
          </span>
        </label>
      ))}
    </fieldset>
  );
}
