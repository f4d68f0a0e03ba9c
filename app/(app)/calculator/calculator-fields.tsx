'use client';

import type { MaterialItem } from '@/src/materials/schema';
import type { StarItem } from '@/src/stars/schema';
import { RunChoiceField } from '@/src/ui/run-choice-field';
import { ownStar } from '@/src/ui/run-draft';
import { exactText } from '@/src/ui/run-figures';
import { starChoices, starFigures } from '@/src/ui/run-form-star';
import type { FieldProblems } from '@/src/ui/run-request-of-draft';
import { RunSelectField } from '@/src/ui/run-select-field';
import { StarNumbersFields } from '@/src/ui/run-star-numbers-fields';
import { RunTextField } from '@/src/ui/run-text-field';
import type { CalculatorText } from './calculator-request';

type Props = {
  text: CalculatorText;
  problems: FieldProblems;
  onChange: (changed: Partial<CalculatorText>) => unknown;
  stars: readonly StarItem[];
  materials: readonly MaterialItem[];
};

const thresholds = [
  { value: 'beta', label: 'Critical beta' },
  { value: 'eccentricity', label: 'Release at pericentre' },
] as const;

export function CalculatorFields({ text, problems, onChange, stars, materials }: Props) {
  const material = materials.find(({ slug }) => slug === text.material);
  const star = stars.find(({ slug }) => slug === text.star);
  return (
    <form className="grid gap-5" aria-label="Calculator" onSubmit={(event) => event.preventDefault()}>
      <RunSelectField
        label="Material"
        value={text.material}
        onChange={(slug) => onChange({ material: slug, density: '' })}
        choices={materials.map(({ slug, name }) => ({ value: slug, label: name }))}
        problem={problems.slug}
        hint={material && `Measured from ${material.validUm[0]} to ${material.validUm[1]} µm`}
      />
      <RunTextField
        label="Density"
        unit="g/cm³"
        value={text.density}
        onChange={(density) => onChange({ density })}
        problem={problems.densityGCm3}
        hint={material && `Empty: ${exactText(material.densityGCm3, 4)}, that of the material`}
      />
      <RunTextField
        label="Porosity"
        value={text.porosity}
        onChange={(porosity) => onChange({ porosity })}
        problem={problems['optics.porosity']}
        hint="Empty: solid grains"
      />
      <RunSelectField
        label="Star"
        value={text.star}
        onChange={(slug) => onChange({ star: slug })}
        choices={starChoices(stars)}
        problem={problems.starSlug}
        hint={star && starFigures(star)}
      />
      {text.star === ownStar && <StarNumbersFields numbers={text} problems={problems} onChange={onChange} />}
      <RunChoiceField
        legend="Unbound from"
        value={text.threshold}
        onChange={(threshold) => onChange({ threshold })}
        choices={thresholds}
      />
      {text.threshold === 'beta' ? (
        <RunTextField
          label="Critical beta"
          value={text.betaCritical}
          onChange={(betaCritical) => onChange({ betaCritical })}
          problem={problems.betaCritical}
          hint="0.5 for a circular parent orbit"
        />
      ) : (
        <RunTextField
          label="Eccentricity of the parent"
          value={text.eccentricity}
          onChange={(eccentricity) => onChange({ eccentricity })}
          problem={problems.eccentricity ?? problems.betaCritical}
          hint="Critical beta is (1 - e) / 2 at pericentre"
        />
      )}
    </form>
  );
}
