/**
 * Sum of oscillators over photon energy E in eV (time factor exp(-i omega t)):
 * eps(E) = eps_inf + sum f E0^2/(E0^2 - E^2 - i g E) over `lorentz` [f, E0, g]
 *        - sum Ep^2/(E^2 + i g E) over `drude` [Ep, g]
 *        + sum of Kramers-Kronig consistent Gaussian pairs over `gauss` [A, E0, s].
 */
export interface DielectricModel {
  kind: 'oscillators';
  eps_inf: number;
  lorentz: [number, number, number][];
  drude: [number, number][];
  gauss: [number, number, number][];
}

/** Tabulated n and k, wavelengths in um ascending; n and ln k are linear in ln lambda, clamped outside. */
export interface TabulatedIndex {
  kind: 'table';
  wavelengthUm: number[];
  n: number[];
  k: number[];
}

/** One refractive index for all wavelengths. */
export interface ConstantIndex {
  kind: 'constant';
  n: number;
  k: number;
}

export type IndexModel = DielectricModel | TabulatedIndex | ConstantIndex;

/** Optical constants of one material; several components mean that their efficiencies are averaged with the weights. */
export interface Optics {
  components: { weight: number; model: IndexModel }[];
  validUm: [number, number];
}

/**
 * What a grain is made of. `porosity` is the volume share of vacuum voids in the core's solid; with `mixing`
 * 'maxwellGarnett' the solid is the matrix and the voids are the inclusions (default 'bruggeman').
 * `mantle.volumeFraction` is the mantle's share of the whole grain's volume.
 */
export interface OpticsRecipe {
  core: Optics;
  porosity?: number;
  mixing?: 'bruggeman' | 'maxwellGarnett';
  mantle?: { optics: Optics; volumeFraction: number };
}
