/**
 * Share of nodes below a coordinate y (logarithm of wavelength or energy) and its derivative: a part laid evenly over
 * [low, high], a part crowded around `centre` as a logistic, and for every narrow feature a Cauchy crowd, whose slow tails
 * grade the spacing geometrically. The map is analytic, so a trapezoid in it keeps its exponential convergence.
 */
export interface NodeDensity {
  cumulative(y: number): number;
  density(y: number): number;
}

export interface Crowd {
  centre: number;
  width: number;
}

const SHARE_PER_FEATURE = 0.05;
const LARGEST_FEATURE_SHARE = 0.25;

export function nodeDensity(low: number, high: number, evenShare: number, main: Crowd, features: Crowd[]): NodeDensity {
  const inside = features.filter(({ centre }) => centre > low && centre < high);
  const featureShare = Math.min(LARGEST_FEATURE_SHARE, SHARE_PER_FEATURE * inside.length);
  const each = inside.length === 0 ? 0 : featureShare / inside.length;
  const even = ((1 - featureShare) * evenShare) / (high - low);
  const crowded = (1 - featureShare) * (1 - evenShare);
  return {
    cumulative(y) {
      let share = even * (y - low) + crowded / (1 + Math.exp((main.centre - y) / main.width));
      for (const { centre, width } of inside) share += (each * Math.atan((y - centre) / width)) / Math.PI;
      return share;
    },
    density(y) {
      const logistic = 1 / (1 + Math.exp((main.centre - y) / main.width));
      let value = even + (crowded * logistic * (1 - logistic)) / main.width;
      for (const { centre, width } of inside) value += (each * width) / (Math.PI * ((y - centre) ** 2 + width ** 2));
      return value;
    },
  };
}
