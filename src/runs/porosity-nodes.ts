/** Bulk optical constants mean little in a grain that is nearly all vacuum: porosities are taken to be at most this. */
export const greatestPorosity = 0.99;
const spacing = 0.06;

/** Share of vacuum in a grain whose material is denser than it; 0 for grains that are denser than their material. */
export function porosityOf(densityKgM3: number, compactKgM3: number): number {
  return Math.min(greatestPorosity, Math.max(0, 1 - densityKgM3 / compactKgM3));
}

/** Evenly spaced porosities over the range, at least four, for interpolation in between. */
export function evenPorosities(least: number, greatest: number): number[] {
  const intervals = Math.max(3, Math.ceil((greatest - least) / spacing));
  return Array.from({ length: intervals + 1 }, (_, index) => least + ((greatest - least) * index) / intervals);
}
