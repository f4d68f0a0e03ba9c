export type MaterialSummary = {
  material: string;
  name: string;
  grains: number;
  meanDensityGCm3: number;
  betaMax: number;
  radiusAtBetaMaxUm: number;
  unboundIntervalsUm: [number, number | null][];
  geometricBlowoutRadiusUm: number;
  curveKey: string | null;
  relativeErrorBound: number;
  shareOutsideValidRange: number;
  unboundNumberShare: number;
};

export type RunSummary = {
  grains: number;
  counted: number;
  betaCritical: number;
  unbound: {
    rows: number;
    number: number;
    numberShare: number;
    areaShare: number;
    massShare: number;
    expectedNumberShare: number;
    interval95: [number, number];
    repelled: number;
  };
  geometric: { numberShare: number; areaShare: number; massShare: number };
  perMaterial: MaterialSummary[];
  warnings: string[];
};

/** The size distribution split by fate; edges are common to the three weightings, one more than there are bins. */
export type RunHistograms = {
  edgesUm: number[];
  number: FateBins;
  area: FateBins;
  mass: FateBins;
};
export type FateBins = { unbound: number[]; bound: number[] };
