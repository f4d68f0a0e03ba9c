'use client';

import type { ColumnField, ColumnMapping } from '@/src/catalogues/mapping';
import type { PreviewColumn } from '@/src/catalogues/preview-catalogue';

const fields: Record<ColumnField, { words: string; units: string[] }> = {
  ignore: { words: 'leave this column out', units: [] },
  label: { words: 'label', units: [] },
  radius: { words: 'radius', units: ['um', 'nm', 'mm', 'cm', 'm'] },
  radiusSigma: { words: 'one-sigma error of the radius', units: ['um', 'nm', 'mm', 'cm', 'm'] },
  diameter: { words: 'diameter', units: ['um', 'nm', 'mm', 'cm', 'm'] },
  diameterSigma: { words: 'one-sigma error of the diameter', units: ['um', 'nm', 'mm', 'cm', 'm'] },
  mass: { words: 'mass', units: ['kg', 'g', 'mg', 'ug', 'ng', 'pg', 'fg'] },
  massSigma: { words: 'one-sigma error of the mass', units: ['kg', 'g', 'mg', 'ug', 'ng', 'pg', 'fg'] },
  density: { words: 'density', units: ['g_cm3', 'kg_m3'] },
  densitySigma: { words: 'one-sigma error of the density', units: ['g_cm3', 'kg_m3'] },
  material: { words: 'material', units: [] },
  count: { words: 'count', units: [] },
};
const unitWords: Record<string, string> = { um: 'µm', ug: 'µg', g_cm3: 'g/cm³', kg_m3: 'kg/m³' };

type Props = { columns: PreviewColumn[]; mapping: ColumnMapping; onChange: (mapping: ColumnMapping) => void };

/** What each column holds: as its header says, or as the person says. */
export function ColumnChoices({ columns, mapping, onChange }: Props) {
  const choose = (header: string, field: ColumnField | '') => {
    const { [header]: _before, ...others } = mapping;
    const unit = field === '' ? undefined : fields[field].units[0];
    onChange(field === '' ? others : { ...others, [header]: unit ? { field, unit } : { field } });
  };
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Columns of the file">
      <table className="w-full min-w-[30rem] text-sm">
        <caption className="sr-only">Columns of the file and what they hold</caption>
        <thead className="text-muted text-left">
          <tr>
            <th scope="col" className="py-1.5 pr-4 font-medium">
              Column
            </th>
            <th scope="col" className="py-1.5 pr-4 font-medium">
              Holds
            </th>
            <th scope="col" className="py-1.5 font-medium">
              Unit
            </th>
          </tr>
        </thead>
        <tbody>
          {columns.map(({ index, header, field, unit, problem }) => {
            const chosen = mapping[header];
            const understood = field ? `as the header says: ${fields[field].words}` : 'not understood: choose';
            return (
              <tr key={index} className="border-line border-t">
                <th scope="row" className="max-w-52 py-2 pr-4 text-left font-mono font-normal break-all">
                  {header || '(no name)'}
                </th>
                <td className="py-2 pr-4">
                  <select
                    aria-label={`What the column ${header} holds`}
                    value={chosen?.field ?? ''}
                    onChange={(event) => choose(header, event.target.value as ColumnField | '')}
                    className={`bg-panel h-9 w-full min-w-44 rounded border px-2 ${problem && !chosen ? 'border-danger' : 'border-field'}`}
                  >
                    <option value="">{understood}</option>
                    {Object.entries(fields).map(([name, { words }]) => (
                      <option key={name} value={name}>
                        {words}
                      </option>
                    ))}
                  </select>
                </td>
                <td className="py-2">
                  {chosen && fields[chosen.field].units.length > 0 ? (
                    <select
                      aria-label={`Unit of the column ${header}`}
                      value={chosen.unit}
                      onChange={(event) =>
                        onChange({ ...mapping, [header]: { field: chosen.field, unit: event.target.value } })
                      }
                      className="border-field bg-panel h-9 rounded border px-2"
                    >
                      {fields[chosen.field].units.map((choice) => (
                        <option key={choice} value={choice}>
                          {unitWords[choice] ?? choice}
                        </option>
                      ))}
                    </select>
                  ) : (
                    !chosen && unit && (unitWords[unit] ?? unit)
                  )}
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
