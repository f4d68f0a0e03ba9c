'use client';

import type { RunDraft } from './run-draft';
import type { FieldProblems } from './run-request-of-draft';
import { RunTextField } from './run-text-field';

type StarNumbersText = Pick<RunDraft, 'massSun' | 'luminositySun' | 'teffK'>;
type Props = {
  numbers: StarNumbersText;
  problems: FieldProblems;
  onChange: (changed: Partial<StarNumbersText>) => void;
};

export function StarNumbersFields({ numbers, problems, onChange }: Props) {
  return (
    <div className="grid gap-4 sm:grid-cols-3">
      <RunTextField
        label="Mass"
        unit="M☉"
        value={numbers.massSun}
        onChange={(massSun) => onChange({ massSun })}
        problem={problems['star.massSun']}
      />
      <RunTextField
        label="Luminosity"
        unit="L☉"
        value={numbers.luminositySun}
        onChange={(luminositySun) => onChange({ luminositySun })}
        problem={problems['star.luminositySun']}
      />
      <RunTextField
        label="Effective temperature"
        unit="K"
        value={numbers.teffK}
        onChange={(teffK) => onChange({ teffK })}
        problem={problems['star.teffK']}
      />
    </div>
  );
}
