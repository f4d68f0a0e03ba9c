const FEWEST_BINS = 5;
const MOST_BINS = 60;
/** A population of one size still needs a bin to stand in. */
const LEAST_LN_SPAN = 0.02;

/**
 * Edges (m) of a size histogram, even in ln radius: width 2 IQR n^(-1/3) of ln radius, between 5 and 60 bins over the whole
 * range. Radii as natural logarithms of m. Source: Freedman & Diaconis (1981), Z. Wahrscheinlichkeitstheorie 57, 453.
 */
export function histogramEdgesM({
  rows,
  lnMin,
  lnMax,
  lnQuartile1,
  lnQuartile3,
}: {
  rows: number;
  lnMin: number;
  lnMax: number;
  lnQuartile1: number;
  lnQuartile3: number;
}): number[] {
  const isNarrow = lnMax - lnMin < LEAST_LN_SPAN;
  const low = isNarrow ? (lnMin + lnMax - LEAST_LN_SPAN) / 2 : lnMin;
  const span = isNarrow ? LEAST_LN_SPAN : lnMax - lnMin;
  const width = (2 * (lnQuartile3 - lnQuartile1)) / Math.cbrt(rows);
  const wanted = width > 0 ? Math.ceil(span / width) : FEWEST_BINS;
  const bins = Math.min(MOST_BINS, Math.max(FEWEST_BINS, wanted));
  return Array.from({ length: bins + 1 }, (_, index) => Math.exp(low + (span * index) / bins));
}
