'use client';

import type { ColumnField, ColumnMapping } from '@/src/catalogues/mapping';
import type { PreviewColumn } from '@/src/catalogues/preview-catalogue';
import { choiceFor, unitsOf, withChoice } from './choose-column';
import { asItStands, fieldWords, needsAnswer, unitWords } from './column-words';

type Props = {
  column: PreviewColumn;
  firstValues: string[];
  mapping: ColumnMapping;
  onChange: (mapping: ColumnMapping) => void;
};

const selectClass = 'bg-panel aria-invalid:border-danger border-field h-10 rounded-md border px-2';

/** One column of the file as a row of the table of columns. */
export function ColumnChoice({ column, firstValues, mapping, onChange }: Props) {
  const { header, unit } = column;
  const chosen = choiceFor(mapping, header);
  const name = header || `number ${column.index + 1}`;
  const units = chosen ? unitsOf(chosen.field) : [];
  return (
    <tr className="border-line border-t align-top">
      <th scope="row" className="max-w-28 py-2 pr-3 text-left font-mono font-normal sm:max-w-72 sm:pr-6">
        <span className="break-all">{header || '(no name)'}</span>
        <span className="text-muted block truncate text-xs">{firstValues.join(' · ')}</span>
      </th>
      <td className="py-2 pr-3 sm:pr-6">
        <select
          aria-label={`What the column ${name} holds`}
          aria-invalid={needsAnswer(column) && !chosen}
          value={chosen?.field ?? ''}
          onChange={({ target }) => onChange(withChoice(mapping, column, (target.value || null) as ColumnField | null))}
          className={`${selectClass} w-full min-w-32`}
        >
          <option value="">{asItStands(column)}</option>
          {Object.entries(fieldWords).map(([field, words]) => (
            <option key={field} value={field}>
              {words}
            </option>
          ))}
        </select>
      </td>
      <td className="py-2">
        {chosen && units.length > 0 ? (
          <select
            aria-label={`Unit of the column ${name}`}
            aria-invalid={chosen.unit === undefined}
            value={chosen.unit ?? ''}
            onChange={({ target }) => onChange({ ...mapping, [header]: { ...chosen, unit: target.value } })}
            className={selectClass}
          >
            {chosen.unit === undefined && <option value="">choose</option>}
            {units.map((symbol) => (
              <option key={symbol} value={symbol}>
                {unitWords(symbol)}
              </option>
            ))}
          </select>
        ) : (
          <span className="inline-flex h-10 items-center">{!chosen && unit ? unitWords(unit) : ''}</span>
        )}
      </td>
    </tr>
  );
}
