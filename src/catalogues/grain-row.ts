export type GrainRow = {
  line: number;
  label: string | null;
  radiusM: number;
  radiusSigmaM: number | null;
  densityKgM3: number;
  densitySigmaKgM3: number | null;
  material: string;
  count: number;
};
