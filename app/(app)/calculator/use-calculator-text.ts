'use client';

import { parseAsString, parseAsStringLiteral, useQueryStates } from 'nuqs';
import type { CalculatorText } from './calculator-request';

const thresholds = ['beta', 'eccentricity'] as const;

/** Everything that was typed, in the address; what is as at first is left out. */
export function useCalculatorText(material: string, star: string) {
  return useQueryStates(
    {
      material: parseAsString.withDefault(material),
      star: parseAsString.withDefault(star),
      massSun: parseAsString.withDefault('1'),
      luminositySun: parseAsString.withDefault('1'),
      teffK: parseAsString.withDefault('5772'),
      density: parseAsString.withDefault(''),
      threshold: parseAsStringLiteral(thresholds).withDefault('beta'),
      betaCritical: parseAsString.withDefault('0.5'),
      eccentricity: parseAsString.withDefault('0'),
      porosity: parseAsString.withDefault(''),
    } satisfies Record<keyof CalculatorText, unknown>,
    { history: 'replace' },
  );
}
