import type { NarrowFeature } from './narrow-features';
import { planckGrid } from './planck-grid';
import type { SpectralGrid } from './spectral-grid';
import { tableGrid } from './table-grid';

/**
 * Light at the grain: a black body, or a table of spectral flux F_lambda on any scale, wavelengths in um ascending,
 * fluxes not negative and not all zero. Only the shape counts: the luminosity is an input of its own.
 */
export type Spectrum = { kind: 'planck'; teffK: number } | { kind: 'table'; wavelengthUm: number[]; flux: number[] };

/** Energy weights of a spectrum on `levels` nested grids of 32, 64, ... intervals, crowded around `features`. */
export function spectralGrid(spectrum: Spectrum, levels: number, features: NarrowFeature[] = []): SpectralGrid {
  return spectrum.kind === 'planck'
    ? planckGrid(spectrum.teffK, levels, features)
    : tableGrid(spectrum, levels, features);
}
