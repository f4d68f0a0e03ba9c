/**
 * Wavelength nodes of a spectral mean, ascending in wavelength and nested: level l uses every 2^(levels-1-l)-th node.
 * `weights[l]` belongs to those nodes and sums to 1: the energy mean of Q is sum of weights[l][i] Q(node i 2^(levels-1-l)).
 */
export interface SpectralGrid {
  wavelengthM: Float64Array;
  weights: Float64Array[];
}

/** Intervals of level 0; level l has COARSEST_INTERVALS 2^l of them. */
export const COARSEST_INTERVALS = 32;

/** Wavelength (m) that halves the energy of the spectrum. */
export function medianWavelengthM(grid: SpectralGrid): number {
  const weights = grid.weights[grid.weights.length - 1];
  let below = 0;
  let index = 0;
  while (index < weights.length - 1 && below + weights[index] < 0.5) below += weights[index++];
  return grid.wavelengthM[index];
}

/** Share of the energy at wavelengths outside [low, high] um, to the resolution of the nodes. */
export function shareOutside(grid: SpectralGrid, [lowUm, highUm]: [number, number]): number {
  const weights = grid.weights[grid.weights.length - 1];
  let outside = 0;
  for (let index = 0; index < weights.length; index++) {
    const wavelengthUm = grid.wavelengthM[index] * 1e6;
    if (wavelengthUm < lowUm || wavelengthUm > highUm) outside += weights[index];
  }
  return Math.min(1, outside);
}
