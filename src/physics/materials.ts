import { dawson } from './dawson';
import type { DielectricModel, IndexModel, Optics, TabulatedIndex } from './optics';

export type { ConstantIndex, DielectricModel, IndexModel, Optics, OpticsRecipe, TabulatedIndex } from './optics';

/** Photon energy times wavelength, eV um: the value with which the library's models were fitted. */
export const EV_UM = 1.23984198;

const TWO_OVER_SQRT_PI = 2 / Math.sqrt(Math.PI);

/** An entry of the material library as stored in JSON, models without their `kind`. */
export interface LibraryEntry {
  components: {
    weight: number;
    model: { eps_inf: number; lorentz: number[][]; drude: number[][]; gauss: number[][] };
  }[];
  valid_um: number[];
}

/** Optics of a library entry (fixtures/materials/materials.json). */
export function opticsFromLibraryEntry(entry: LibraryEntry): Optics {
  return {
    components: entry.components.map(({ weight, model }) => ({
      weight,
      model: {
        kind: 'oscillators',
        eps_inf: model.eps_inf,
        lorentz: model.lorentz.map(([strength, centreEv, widthEv]) => [strength, centreEv, widthEv]),
        drude: model.drude.map(([plasmaEv, dampingEv]) => [plasmaEv, dampingEv]),
        gauss: model.gauss.map(([height, centreEv, widthEv]) => [height, centreEv, widthEv]),
      },
    })),
    validUm: [entry.valid_um[0], entry.valid_um[1]],
  };
}

/** Optics with the same index n + ik at every wavelength. */
export function constantOptics(n: number, k: number): Optics {
  return { components: [{ weight: 1, model: { kind: 'constant', n, k } }], validUm: [0, Infinity] };
}

/**
 * Complex refractive index [n, k], k >= 0, at a vacuum wavelength in m. Oscillator models are evaluated at any
 * wavelength; tables are clamped at their ends. Relative error of the evaluation: 1e-12.
 */
export function refractiveIndex(model: IndexModel, wavelengthM: number): [number, number] {
  if (model.kind === 'constant') return [model.n, model.k];
  if (model.kind === 'table') return tabulated(model, wavelengthM * 1e6);
  return indexOfEps(dielectricFunction(model, EV_UM / (wavelengthM * 1e6)));
}

/** Refractive index of a model at many wavelengths (m), as typed arrays. */
export function tabulateIndex(model: IndexModel, wavelengthM: Float64Array): { n: Float64Array; k: Float64Array } {
  const n = new Float64Array(wavelengthM.length);
  const k = new Float64Array(wavelengthM.length);
  for (let index = 0; index < wavelengthM.length; index++)
    [n[index], k[index]] = refractiveIndex(model, wavelengthM[index]);
  return { n, k };
}

/** [Re eps, Im eps] of an oscillator model at a photon energy in eV. */
export function dielectricFunction(model: DielectricModel, energyEv: number): [number, number] {
  let re = model.eps_inf;
  let im = 0;
  const energy2 = energyEv * energyEv;
  for (const [strength, centreEv, widthEv] of model.lorentz) {
    const centre2 = centreEv * centreEv;
    const detuning = centre2 - energy2;
    const damping = widthEv * energyEv;
    const scale = (strength * centre2) / (detuning * detuning + damping * damping);
    re += scale * detuning;
    im += scale * damping;
  }
  for (const [plasmaEv, dampingEv] of model.drude) {
    const scale = (plasmaEv * plasmaEv) / (energy2 + dampingEv * dampingEv);
    re -= scale;
    im += (scale * dampingEv) / energyEv;
  }
  for (const [height, centreEv, widthEv] of model.gauss) {
    const above = (energyEv + centreEv) / widthEv;
    const below = (energyEv - centreEv) / widthEv;
    re += TWO_OVER_SQRT_PI * height * (dawson(above) - dawson(below));
    // exp(-below^2) - exp(-above^2) without cancellation at small energies.
    im += height * Math.exp(-below * below) * -Math.expm1((-4 * energyEv * centreEv) / (widthEv * widthEv));
  }
  return [re, im];
}

/** Square root of eps with k >= 0: [n, k]. */
function indexOfEps([re, im]: [number, number]): [number, number] {
  const modulus = Math.hypot(re, im);
  if (re >= 0) {
    const n = Math.sqrt(0.5 * (modulus + re));
    return [n, im / (2 * n)];
  }
  const k = Math.sqrt(0.5 * (modulus - re));
  return [im / (2 * k), k];
}

function tabulated(table: TabulatedIndex, wavelengthUm: number): [number, number] {
  const grid = table.wavelengthUm;
  const last = grid.length - 1;
  if (wavelengthUm <= grid[0]) return [table.n[0], table.k[0]];
  if (wavelengthUm >= grid[last]) return [table.n[last], table.k[last]];
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (grid[middle] <= wavelengthUm) low = middle;
    else high = middle;
  }
  const share = Math.log(wavelengthUm / grid[low]) / Math.log(grid[high] / grid[low]);
  return [(1 - share) * table.n[low] + share * table.n[high], interpolateK(table.k[low], table.k[high], share)];
}

/** A table may print k = 0, which has no logarithm: there k itself is linear. */
function interpolateK(low: number, high: number, share: number): number {
  if (low <= 0 || high <= 0) return (1 - share) * low + share * high;
  return low * (high / low) ** share;
}
