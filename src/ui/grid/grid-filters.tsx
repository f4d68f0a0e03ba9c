'use client';

import { useId, useState } from 'react';
import { Button } from '@/src/ui/button';
import { rangeProblem } from './filter-problem';
import { FilterControl } from './filter-control';
import type { FilterValues, GridFilter } from './grid-column';

type Props = { filters: readonly GridFilter[]; label: string; onChange: (values: FilterValues) => void };

export function GridFilters({ filters, label, onChange }: Props) {
  const id = useId();
  const [values, setValues] = useState<FilterValues>({});
  const problems = filters.map((filter) => problemOf(filter, values));
  const apply = () => {
    if (problems.every((problem) => problem === null)) onChange(values);
  };
  const clear = () => {
    setValues({});
    onChange({});
  };
  return (
    <form
      className="flex flex-wrap items-end gap-x-4 gap-y-2"
      aria-label={`Filter: ${label}`}
      onSubmit={(event) => {
        event.preventDefault();
        apply();
      }}
    >
      {filters.map((filter, index) => (
        <FilterControl
          key={filter.label}
          id={`${id}-${index}`}
          filter={filter}
          values={values}
          problem={problems[index]}
          onChange={(param, value) => setValues({ ...values, [param]: value })}
        />
      ))}
      <div className="flex gap-1">
        <Button type="submit" variant="secondary" size="small">
          Filter
        </Button>
        <Button variant="quiet" size="small" onClick={clear}>
          Clear
        </Button>
      </div>
    </form>
  );
}

function problemOf(filter: GridFilter, values: FilterValues): string | null {
  return filter.kind === 'range' ? rangeProblem(values[filter.minParam] ?? '', values[filter.maxParam] ?? '') : null;
}
