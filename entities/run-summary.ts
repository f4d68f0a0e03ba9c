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
