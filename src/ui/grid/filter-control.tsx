'use client';

import type { FilterValues, GridFilter } from './grid-column';

type Props = {
  id: string;
  filter: GridFilter;
  values: FilterValues;
  problem: string | null;
  onChange: (param: string, value: string) => void;
};

const inputClass = 'border-field bg-panel h-8 rounded border px-2';

export function FilterControl({ id, filter, values, problem, onChange }: Props) {
  if (filter.kind === 'range')
    return <RangeFilter id={id} filter={filter} values={values} problem={problem} onChange={onChange} />;
  const value = values[filter.param] ?? '';
  return (
    <div className="grid gap-0.5 text-sm">
      <label htmlFor={id}>{filter.label}</label>
      {filter.kind === 'choice' ? (
        <select
          id={id}
          value={value}
          className={inputClass}
          onChange={(event) => onChange(filter.param, event.target.value)}
        >
          <option value="">All</option>
          {filter.choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      ) : (
        <input
          id={id}
          value={value}
          className={`${inputClass} w-32`}
          onChange={(event) => onChange(filter.param, event.target.value)}
        />
      )}
    </div>
  );
}

function RangeFilter({
  id,
  filter,
  values,
  problem,
  onChange,
}: Props & { filter: Extract<GridFilter, { kind: 'range' }> }) {
  const end = (param: string, which: 'from' | 'to') => (
    <input
      inputMode="decimal"
      aria-label={`${filter.label} ${which}${filter.unit ? `, ${filter.unit}` : ''}`}
      aria-invalid={problem !== null}
      aria-describedby={problem ? `${id}-problem` : undefined}
      value={values[param] ?? ''}
      className={`${inputClass} w-20 font-mono`}
      onChange={(event) => onChange(param, event.target.value)}
    />
  );
  return (
    <fieldset className="grid gap-0.5 text-sm">
      <legend>
        {filter.label}
        {filter.unit && <span className="text-muted"> ({filter.unit})</span>}
      </legend>
      <div className="flex items-center gap-1">
        {end(filter.minParam, 'from')} <span aria-hidden="true">to</span> {end(filter.maxParam, 'to')}
      </div>
      {problem && (
        <p id={`${id}-problem`} className="text-danger" role="alert">
          {problem}
        </p>
      )}
    </fieldset>
  );
}
