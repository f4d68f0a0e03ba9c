import type { StarSpectrum } from './star-version';

export type RunOptics = {
  model: 'mie' | 'constant';
  qpr?: number;
  porosity?: number | 'fromDensity';
  mixing?: 'bruggeman' | 'maxwellGarnett';
  mantle?: { material: string; volumeFraction: number };
};

export type RunRelease = {
  distanceAu: number;
  eccentricity: number;
  at: 'pericentre' | 'apocentre' | 'anomaly';
  trueAnomalyDeg?: number;
  parentBeta?: number;
};

export type FrozenStar = {
  slug: string | null;
  version: number | null;
  name: string;
  massSun: number;
  luminositySun: number;
  teffK: number;
  radiusSun: number | null;
  spectrum: StarSpectrum | null;
  citation: string;
};

export type FrozenMaterial = {
  slug: string;
  version: number;
  name: string;
  densityKgM3: number;
  optics: object;
  citation: string;
};

/** Every input of a run, by value: what was asked, and what the star and the materials were at that moment. */
export type RunInputs = {
  catalogue: { id: string; name: string; sha256: string; rows: number };
  star: FrozenStar;
  release: RunRelease;
  optics: RunOptics;
  wind?: { massLossSunPerYr: number; speedKmS: number; qsw: number };
  disc?: { opticalDepth: number };
  charging?: { potentialV: number; fieldNT: number };
  betaCritical: number;
  materials: FrozenMaterial[];
};
