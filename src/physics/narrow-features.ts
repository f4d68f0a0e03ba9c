import { brentRoot } from './brent';
import { dielectricFunction, EV_UM } from './materials';
import type { DielectricModel, OpticsRecipe } from './optics';

/** A place in the spectrum where the optical constants change within a small relative step of wavelength. */
export interface NarrowFeature {
  wavelengthM: number;
  relativeWidth: number;
}

const NARROW = 0.03;
/** Narrower resonances absorb next to nothing and would only starve the rest of the grid. */
const NARROWEST = 1e-5;
const SCAN_STEPS = 120;
/** A small sphere resonates above the oscillator, at most this much higher (relative) for any oscillator strength met. */
const LARGEST_SHIFT = 0.2;

/**
 * Oscillators of a recipe narrower than 3 % and the resonances eps = -2 that small spheres have above them (Bohren & Huffman
 * 1983, section 12.2): wavelength grids crowd there, since a grain small against the wavelength may owe most of its
 * absorption to one such place. Without it 1 nm grains of one library material err by 30 %.
 */
export function narrowFeatures({ core, mantle }: OpticsRecipe): NarrowFeature[] {
  const components = [...core.components, ...(mantle?.optics.components ?? [])];
  return components.flatMap(({ model }) => (model.kind === 'oscillators' ? featuresOf(model) : []));
}

function featuresOf(model: DielectricModel): NarrowFeature[] {
  return [...model.gauss, ...model.lorentz]
    .filter(([, centreEv, widthEv]) => widthEv / centreEv < NARROW)
    .flatMap(([, centreEv, widthEv]) => [
      { wavelengthM: wavelengthOf(centreEv), relativeWidth: widthEv / centreEv },
      ...sphereResonance(model, centreEv, widthEv / centreEv),
    ]);
}

/** First rise of Re eps through -2 above an oscillator, as wide as Im eps makes it; none when Re eps stays above -2. */
function sphereResonance(model: DielectricModel, centreEv: number, relativeWidth: number): NarrowFeature[] {
  const excess = (energyEv: number) => dielectricFunction(model, energyEv)[0] + 2;
  const energyAt = (step: number) =>
    centreEv * (1 + relativeWidth * Math.expm1((step / SCAN_STEPS) * Math.log1p(LARGEST_SHIFT / relativeWidth)));
  for (let step = 1; step <= SCAN_STEPS; step++) {
    const low = energyAt(step - 1);
    const high = energyAt(step);
    if (excess(low) >= 0 || excess(high) < 0) continue;
    const energyEv = brentRoot(excess, low, high, 1e-12 * centreEv);
    const slope = excess(energyEv * (1 + 1e-6)) / 1e-6;
    const width = dielectricFunction(model, energyEv)[1] / slope;
    return [{ wavelengthM: wavelengthOf(energyEv), relativeWidth: Math.max(width, NARROWEST) }];
  }
  return [];
}

function wavelengthOf(energyEv: number): number {
  return (EV_UM / energyEv) * 1e-6;
}
