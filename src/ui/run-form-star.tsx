'use client';

import type { StarItem } from '@/src/stars/schema';
import { ownStar } from './run-draft';
import { exactText } from './run-figures';
import { FormPart, type FormPartProps } from './run-form-part';
import { StarNumbersFields } from './run-star-numbers-fields';
import { RunSelectField } from './run-select-field';

export function RunFormStar({ draft, problems, onChange, stars }: FormPartProps & { stars: readonly StarItem[] }) {
  const preset = stars.find(({ slug }) => slug === draft.star);
  return (
    <FormPart title="Star">
      <div className="max-w-md">
        <RunSelectField
          label="Star"
          value={draft.star}
          onChange={(star) => onChange({ star })}
          problem={problems.starSlug}
          empty="Choose a star"
          choices={starChoices(stars)}
          hint={preset && starFigures(preset)}
        />
      </div>
      {draft.star === ownStar && <StarNumbersFields numbers={draft} problems={problems} onChange={onChange} />}
    </FormPart>
  );
}

export const starChoices = (stars: readonly StarItem[]) => [
  ...stars.map(({ slug, name, spectralType }) => ({
    value: slug,
    label: spectralType ? `${name} (${spectralType})` : name,
  })),
  { value: ownStar, label: 'Own numbers' },
];

export const starFigures = ({ massSun, luminositySun, teffK, spectrum }: StarItem) =>
  `${exactText(massSun, 4)} M☉, ${exactText(luminositySun, 4)} L☉, ${teffK} K, ${spectrum === 'table' ? 'tabulated spectrum' : 'black body'}`;
