'use client';

import { useId, useState, type FormEvent } from 'react';
import { Button } from '@/src/ui/button';
import { parseRadiusRange, type RadiusRangeUm } from './radius-range';

type Props = { rangeUm: RadiusRangeUm; isZoomed: boolean; onChoose: (rangeUm: RadiusRangeUm | null) => void };

/** The zoom without a pointer: both ends as numbers, and the way back. */
export function RadiusRangeControl({ rangeUm, isZoomed, onChoose }: Props) {
  const id = useId();
  const [problem, setProblem] = useState('');
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const asked = parseRadiusRange(`${form.get('from')}..${form.get('to')}`);
    setProblem(asked ? '' : 'Give two radii between 0.001 and 10000 µm, the smaller one first.');
    if (asked) onChoose(asked);
  };
  const [from, to] = rangeUm.map((radius) => String(Number(radius.toPrecision(3))));
  return (
    <form
      onSubmit={submit}
      className="flex flex-wrap items-center gap-2 text-sm"
      aria-label="Radii shown"
      key={`${from}-${to}`}
    >
      <label htmlFor={`${id}-from`}>Radii from</label>
      <input
        id={`${id}-from`}
        name="from"
        defaultValue={from}
        inputMode="decimal"
        aria-describedby={`${id}-problem`}
        className={inputClass}
      />
      <label htmlFor={`${id}-to`}>to</label>
      <input
        id={`${id}-to`}
        name="to"
        defaultValue={to}
        inputMode="decimal"
        aria-describedby={`${id}-problem`}
        className={inputClass}
      />
      <span aria-hidden="true">µm</span>
      <Button type="submit" variant="quiet" size="small">
        Show
      </Button>
      {isZoomed && (
        <Button variant="quiet" size="small" onClick={() => onChoose(null)}>
          Whole range
        </Button>
      )}
      <span id={`${id}-problem`} role="alert" className="text-danger">
        {problem}
      </span>
    </form>
  );
}

const inputClass = 'border-line bg-panel h-8 w-20 rounded border px-2 font-mono tabular-nums';
