import { brentRoot } from './brent';
import { dielectricFunction, EV_UM } from './materials';
import { epsToIndex, indexToEps, porousIndex } from './mixtures';
import type { IndexModel, OpticsRecipe } from './optics';
import { CURVE_RADIUS_MIN_M } from './radius-grid';

/** A place in the spectrum where the optical constants change within a small relative step of wavelength. */
export interface NarrowFeature {
  wavelengthM: number;
  relativeWidth: number;
}

const NARROW = 0.03;
/** A sphere of size parameter x resonates lower by a share of the order of x^2: so wide a crowd serves all radii. */
const SHIFT_PER_X2 = 0.3;
const SCAN_STEPS = 120;
/** A small sphere resonates above the oscillator, at most this much higher (relative) for any oscillator strength met ... */
const LARGEST_SHIFT = 0.2;
/** ... or so many widths, if it is a wide one: beyond its wing little absorbs, and the resonance is narrow all the same. */
const SHIFT_IN_WIDTHS = 5;

/**
 * Oscillators of a recipe narrower than 3 % and the resonances eps = -2 that small spheres have above an oscillator (Bohren
 * & Huffman 1983, section 12.2) where those are narrow: wavelength grids crowd there, since a grain small against the
 * wavelength may owe most of its absorption to one such place. Without it 1 nm grains of one library material err by 30 %.
 */
export function narrowFeatures({ core, porosity = 0, mixing = 'bruggeman', mantle }: OpticsRecipe): NarrowFeature[] {
  const voids = ({ model }: { model: IndexModel }) => featuresOf(model, (eps) => porousEps(eps, porosity, mixing));
  const solid = ({ model }: { model: IndexModel }) => featuresOf(model, (eps) => eps);
  return withoutRepeats([...core.components.flatMap(voids), ...(mantle?.optics.components.flatMap(solid) ?? [])]);
}

type Eps = [number, number];

function featuresOf(model: IndexModel, mixed: (solid: Eps) => Eps): NarrowFeature[] {
  if (model.kind !== 'oscillators') return [];
  const epsAt = (energyEv: number) => mixed(dielectricFunction(model, energyEv));
  return [...model.gauss, ...model.lorentz]
    .flatMap(([, centreEv, widthEv]) => [
      { wavelengthM: wavelengthOf(centreEv), relativeWidth: widthEv / centreEv },
      ...sphereResonances(epsAt, centreEv, widthEv / centreEv),
    ])
    .filter(({ relativeWidth }) => relativeWidth < NARROW);
}

/** Rises of Re eps through -2 above an oscillator, as wide as Im eps makes them; voids may add one of their own. */
function sphereResonances(epsAt: (energyEv: number) => Eps, centreEv: number, relativeWidth: number): NarrowFeature[] {
  const excess = (energyEv: number) => epsAt(energyEv)[0] + 2;
  const resonances: NarrowFeature[] = [];
  const reach = Math.log1p(Math.max(LARGEST_SHIFT / relativeWidth, SHIFT_IN_WIDTHS));
  const energyAt = (step: number) => centreEv * (1 + relativeWidth * Math.expm1((step / SCAN_STEPS) * reach));
  let low = energyAt(0);
  let isBelow = excess(low) < 0;
  for (let step = 1; step <= SCAN_STEPS; step++) {
    const high = energyAt(step);
    const isAbove = excess(high) >= 0;
    if (isBelow && isAbove) {
      const energyEv = brentRoot(excess, low, high, 1e-12 * centreEv);
      const slope = excess(energyEv * (1 + 1e-6)) / 1e-6;
      const width = epsAt(energyEv)[1] / slope;
      const wavelengthM = wavelengthOf(energyEv);
      const smallestX = (2 * Math.PI * CURVE_RADIUS_MIN_M) / wavelengthM;
      resonances.push({ wavelengthM, relativeWidth: Math.max(width, SHIFT_PER_X2 * smallestX ** 2) });
    }
    low = high;
    isBelow = !isAbove;
  }
  return resonances;
}

function porousEps(solid: Eps, porosity: number, mixing: 'bruggeman' | 'maxwellGarnett'): Eps {
  return porosity === 0 ? solid : indexToEps(porousIndex(epsToIndex(solid), porosity, mixing));
}

/** Several oscillators may lead to the same resonance. */
function withoutRepeats(features: NarrowFeature[]): NarrowFeature[] {
  return features.filter(
    (feature, index) =>
      !features
        .slice(0, index)
        .some((other) => Math.abs(other.wavelengthM / feature.wavelengthM - 1) < 0.1 * feature.relativeWidth),
  );
}

function wavelengthOf(energyEv: number): number {
  return (EV_UM / energyEv) * 1e-6;
}
