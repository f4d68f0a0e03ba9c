'use client';

import type { FormPartProps } from './run-form-part';
import { RunTextField } from './run-text-field';
import { RunToggleField } from './run-toggle-field';

export function RunFormSurroundings({ draft, problems, onChange }: FormPartProps) {
  const text = (
    key: 'massLossSunPerYr' | 'windSpeedKmS' | 'qsw' | 'opticalDepth' | 'potentialV' | 'fieldNT',
    pointer: string,
  ) => ({
    value: draft[key],
    onChange: (value: string) => onChange({ [key]: value }),
    problem: problems[pointer],
  });
  return (
    <div className="grid gap-5">
      <RunToggleField
        label="Stellar wind"
        hint="Adds the push and the drag of the wind."
        isOn={draft.hasWind}
        onChange={(hasWind) => onChange({ hasWind })}
      >
        <RunTextField label="Mass loss" unit="M☉/yr" {...text('massLossSunPerYr', 'wind.massLossSunPerYr')} />
        <RunTextField label="Speed" unit="km/s" {...text('windSpeedKmS', 'wind.speedKmS')} />
        <RunTextField label="Momentum transfer" hint="1: all that hits" {...text('qsw', 'wind.qsw')} />
      </RunToggleField>
      <RunToggleField
        label="Collisions in a disc"
        hint="Gives bound grains a collision time."
        isOn={draft.hasDisc}
        onChange={(hasDisc) => onChange({ hasDisc })}
      >
        <RunTextField
          label="Optical depth"
          hint="Face on, at the release distance"
          {...text('opticalDepth', 'disc.opticalDepth')}
        />
      </RunToggleField>
      <RunToggleField
        label="Charging"
        hint="Compares the magnetic force with gravity for each grain; the fate itself stays that of beta."
        isOn={draft.hasCharging}
        onChange={(hasCharging) => onChange({ hasCharging })}
      >
        <RunTextField label="Surface potential" unit="V" {...text('potentialV', 'charging.potentialV')} />
        <RunTextField label="Azimuthal field" unit="nT" {...text('fieldNT', 'charging.fieldNT')} />
      </RunToggleField>
    </div>
  );
}
