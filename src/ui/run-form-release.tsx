'use client';

import { criticalBetaOfDraft } from './run-critical-beta';
import { exactText } from './run-figures';
import { RunChoiceField } from './run-choice-field';
import { FormPart, type FormPartProps } from './run-form-part';
import { RunTextField } from './run-text-field';

const places = [
  { value: 'pericentre', label: 'At pericentre' },
  { value: 'apocentre', label: 'At apocentre' },
  { value: 'anomaly', label: 'At a true anomaly' },
] as const;

export function RunFormRelease({ draft, problems, onChange }: FormPartProps) {
  const critical = criticalBetaOfDraft(draft);
  return (
    <FormPart title="Release">
      <div className="grid gap-4 sm:grid-cols-3">
        <RunTextField
          label="Distance from the star"
          unit="au"
          value={draft.distanceAu}
          onChange={(distanceAu) => onChange({ distanceAu })}
          problem={problems['release.distanceAu']}
        />
        <RunTextField
          label="Eccentricity of the parent"
          value={draft.eccentricity}
          onChange={(eccentricity) => onChange({ eccentricity })}
          problem={problems['release.eccentricity']}
        />
        {draft.at === 'anomaly' && (
          <RunTextField
            label="True anomaly"
            unit="degrees"
            value={draft.trueAnomalyDeg}
            onChange={(trueAnomalyDeg) => onChange({ trueAnomalyDeg })}
            problem={problems['release.trueAnomalyDeg']}
          />
        )}
      </div>
      <RunChoiceField
        legend="Where on the orbit"
        value={draft.at}
        onChange={(at) => onChange({ at })}
        choices={places}
      />
      <p className="border-chaff bg-chaff/10 border-l-4 px-4 py-2" role="status">
        {critical === null ? (
          'The critical beta follows from eccentricity and place.'
        ) : (
          <>
            Grains with beta of <strong className="font-mono tabular-nums">{exactText(critical, 4)}</strong> or more
            leave.
          </>
        )}
      </p>
    </FormPart>
  );
}
