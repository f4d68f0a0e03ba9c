import { createParser } from 'nuqs';

export type RadiusRangeUm = [number, number];

export const widestRangeUm: RadiusRangeUm = [1e-3, 1e4];

/** "0.05..30" in the address; anything else counts as no range at all. */
export function parseRadiusRange(text: string): RadiusRangeUm | null {
  const [low, high] = text.split('..').map(Number);
  const sound = low >= widestRangeUm[0] && high <= widestRangeUm[1] && high / low > 1.01;
  return sound ? [low, high] : null;
}

export function writeRadiusRange([low, high]: RadiusRangeUm): string {
  return `${Number(low.toPrecision(4))}..${Number(high.toPrecision(4))}`;
}

export const radiusRangeInUrl = createParser({
  parse: parseRadiusRange,
  serialize: writeRadiusRange,
  eq: (a, b) => a[0] === b[0] && a[1] === b[1],
});

/** A range that shows all the given radii with some air at both ends. */
export function rangeAround(radiiUm: readonly number[]): RadiusRangeUm {
  const known = radiiUm.filter((radius) => Number.isFinite(radius) && radius > 0);
  if (known.length === 0) return widestRangeUm;
  const air = 1.25;
  return clampRange([Math.min(...known) / air, Math.max(...known) * air]);
}

export function clampRange([low, high]: RadiusRangeUm): RadiusRangeUm {
  return [Math.max(low, widestRangeUm[0]), Math.min(high, widestRangeUm[1])];
}

export const asLog = ([low, high]: RadiusRangeUm): [number, number] => [Math.log10(low), Math.log10(high)];
