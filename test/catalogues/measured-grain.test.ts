import { describe, expect, test } from 'vitest';
import { settleGrain, type GrainNumbers, type Measured } from '@/src/catalogues/measured-grain';

const nothing: Measured = {
  radiusM: null,
  radiusSigmaM: null,
  diameterM: null,
  diameterSigmaM: null,
  massKg: null,
  massSigmaKg: null,
  densityKgM3: null,
  densitySigmaKgM3: null,
};

/** Sphere of 1 um and 2500 kg/m3: 4/3 pi s^3 rho = (10/3) pi 1e-15 kg. */
const massKg = (10 / 3) * Math.PI * 1e-15;

function settled(measured: Partial<Measured>, fallback: number | null = null): GrainNumbers {
  const numbers = settleGrain({ ...nothing, ...measured }, fallback);
  if ('reason' in numbers) throw new Error(numbers.reason);
  return numbers;
}
const refused = (measured: Partial<Measured>, fallback: number | null = null) => {
  const numbers = settleGrain({ ...nothing, ...measured }, fallback);
  return 'reason' in numbers ? numbers : null;
};

describe('the numbers of one grain', () => {
  test('a diameter and its error are halved', () => {
    const grain = settled({ diameterM: 1e-6, diameterSigmaM: 2e-7, densityKgM3: 2500 });
    expect(grain).toMatchObject({ radiusM: 5e-7, radiusSigmaM: 1e-7 });
  });

  test('a mass and a density give the radius of the sphere that has them', () => {
    expect(settled({ massKg, densityKgM3: 2500 }).radiusM).toBeCloseTo(1e-6, 20);
    expect(settled({ massKg }, 2500)).toMatchObject({ densityKgM3: 2500, radiusSigmaM: null });
  });

  test('relative errors of mass and density, taken as independent, are divided by three in the radius', () => {
    const byMass = settled({ massKg, massSigmaKg: 0.3 * massKg, densityKgM3: 2500 });
    expect(byMass.radiusSigmaM! / byMass.radiusM).toBeCloseTo(0.1, 12);
    const byBoth = settled({ massKg, massSigmaKg: 0.3 * massKg, densityKgM3: 2500, densitySigmaKgM3: 1000 });
    expect(byBoth.radiusSigmaM! / byBoth.radiusM).toBeCloseTo(0.5 / 3, 12);
  });

  test('mass and size give the density when the row has none, even if a default is there', () => {
    const grain = settled({ massKg, massSigmaKg: 0.4 * massKg, radiusM: 1e-6, radiusSigmaM: 1e-7 }, 3300);
    expect(grain.densityKgM3).toBeCloseTo(2500, 8);
    expect(grain.densitySigmaKgM3! / grain.densityKgM3).toBeCloseTo(0.5, 12);
  });

  test('size, mass and density that disagree by more than 10 % in radius are refused', () => {
    expect(refused({ massKg, densityKgM3: 2500, radiusM: 1.09e-6 })).toBeNull();
    expect(refused({ massKg, densityKgM3: 2500, radiusM: 1.13e-6 })).toMatchObject({ field: 'mass' });
    expect(refused({ massKg, densityKgM3: 2500, radiusM: 2e-6 })).toMatchObject({ field: 'mass' });
  });

  test('radius and diameter in one row must agree', () => {
    expect(refused({ radiusM: 1e-6, diameterM: 1e-6, densityKgM3: 2500 })).toMatchObject({ field: 'diameter' });
    expect(settled({ radiusM: 1e-6, diameterM: 2e-6, densityKgM3: 2500 }).radiusM).toBe(1e-6);
  });

  test('no size and no density are refused, a default density is taken', () => {
    expect(refused({ densityKgM3: 2500 })).toMatchObject({ field: 'radius' });
    expect(refused({ radiusM: 1e-6 })).toMatchObject({ field: 'density' });
    expect(settled({ radiusM: 1e-6 }, 917).densityKgM3).toBe(917);
  });

  test('a mass that makes a metre-sized grain or an impossible density is refused', () => {
    expect(refused({ massKg: 1e6, densityKgM3: 2500 })).toMatchObject({ field: 'mass' });
    expect(refused({ massKg: 1e-9, radiusM: 1e-6 })).toMatchObject({ field: 'mass' });
  });
});
