'use client';

import { useQueryState } from 'nuqs';
import { useCallback } from 'react';
import { clampRange, radiusRangeInUrl, type RadiusRangeUm } from './radius-range';
import type { LogRange } from './radius-ticks';

/** The radii in view, kept in the address; null shows the whole. */
export function useRadiusRange(whole: RadiusRangeUm) {
  const [chosen, setChosen] = useQueryState('radius', radiusRangeInUrl);
  const zoom = useCallback(([from, to]: LogRange) => void setChosen(clampRange([10 ** from, 10 ** to])), [setChosen]);
  return { rangeUm: chosen ?? whole, isZoomed: chosen !== null, choose: setChosen, zoom };
}
