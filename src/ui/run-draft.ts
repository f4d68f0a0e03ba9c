/** The run form as it is being typed: text as it stands in the fields. */
export type RunDraft = {
  name: string;
  catalogueId: string;
  /** Slug of a preset, or ownStar. */
  star: string;
  massSun: string;
  luminositySun: string;
  teffK: string;
  distanceAu: string;
  eccentricity: string;
  at: 'pericentre' | 'apocentre' | 'anomaly';
  trueAnomalyDeg: string;
  parentBeta: string;
  model: 'mie' | 'constant';
  qpr: string;
  structure: 'solid' | 'porous' | 'fromDensity' | 'coated';
  porosity: string;
  mixing: 'bruggeman' | 'maxwellGarnett';
  mantleMaterial: string;
  mantleFraction: string;
  hasWind: boolean;
  massLossSunPerYr: string;
  windSpeedKmS: string;
  qsw: string;
  hasDisc: boolean;
  opticalDepth: string;
  hasCharging: boolean;
  potentialV: string;
  fieldNT: string;
};

export const ownStar = 'own';

/** Grains let go by a body on a circular orbit at 1 au: the textbook case that everything else is compared with. */
export const emptyDraft: RunDraft = {
  name: '',
  catalogueId: '',
  star: '',
  massSun: '1',
  luminositySun: '1',
  teffK: '5772',
  distanceAu: '1',
  eccentricity: '0',
  at: 'pericentre',
  trueAnomalyDeg: '',
  parentBeta: '',
  model: 'mie',
  qpr: '1',
  structure: 'solid',
  porosity: '0.5',
  mixing: 'bruggeman',
  mantleMaterial: '',
  mantleFraction: '0.3',
  hasWind: false,
  massLossSunPerYr: '2e-14',
  windSpeedKmS: '400',
  qsw: '1',
  hasDisc: false,
  opticalDepth: '1e-3',
  hasCharging: false,
  potentialV: '5',
  fieldNT: '3',
};

export const usesAdvanced = (draft: RunDraft): boolean =>
  draft.structure !== 'solid' || draft.hasWind || draft.hasDisc || draft.hasCharging || draft.parentBeta !== '';
