import type { RunItem } from '@/src/runs/schema';
import { inputLines } from './run-input-words';
import { inputsOf } from './run-inputs-of';
import { RunSection } from './run-section';

/** Every input as it was frozen when the run was requested. */
export function RunInputsList({ run }: { run: RunItem }) {
  return (
    <RunSection id="inputs" title="Inputs">
      <dl className="grid gap-x-6 gap-y-3 text-sm sm:grid-cols-[9rem_1fr]">
        {inputLines(inputsOf(run)).map(({ term, value, remark }, index) => (
          <div key={index} className="contents">
            <dt className="text-muted">{term}</dt>
            <dd className="min-w-0 break-words">
              {value}
              {remark && <span className="text-muted block">{remark}</span>}
            </dd>
          </div>
        ))}
      </dl>
    </RunSection>
  );
}
