import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  betaOf,
  betaOfAreaToMass,
  criticalSailDensityKgM2,
  geometricBlowoutRadiusM,
  plateEfficiency,
} from '@/src/physics/beta';
import { criticalBeta, type ReleasePoint } from '@/src/physics/orbit';
import { checksNamed, expectedNumber, expectWithin, titleOf, type Check } from './optics-checks';

const sun = { massSun: 1, luminositySun: 1 };
const stars: Record<string, { massSun: number; luminositySun: number }> = { Sun: sun };
const black = (radiusUm: number, densityGCm3: number, star = sun) =>
  betaOf({ qpr: 1, radiusM: radiusUm * 1e-6, densityKgM3: densityGCm3 * 1000, ...star });

const values: Record<string, () => number> = {
  'beta-K': () => betaOf({ qpr: 1, radiusM: 1, densityKgM3: 1, ...sun }),
  'beta-1um-1gcc': () => black(1, 1),
  'beta-burns': () => black(1, 1),
  'beta-sun-05um': () => black(0.5, 2.5),
  'beta-distance': () => black(1, 2) / black(1, 2),
  'beta-diameter': () => black(0.5, 2.5),
};

test.each(checksNamed('beta-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  expectWithin(check, values[check.id](), expectedNumber(check));
});

const releaseOf = ({ inputs }: Check) => ({
  eccentricity: Number(inputs.e),
  at: (inputs.release ?? inputs.at ?? 'pericentre') as ReleasePoint,
  ...(typeof inputs.trueAnomalyDeg === 'number' ? { trueAnomalyDeg: inputs.trueAnomalyDeg } : {}),
});

test.each(checksNamed('blow-geom-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const { L, M, rho_gcc: density } = check.inputs as Record<string, number>;
  const radiusM = geometricBlowoutRadiusM({
    qpr: 1,
    densityKgM3: density * 1000,
    betaCritical: criticalBeta(releaseOf(check)),
    luminositySun: L,
    massSun: M,
  });
  expectWithin(check, radiusM * 1e6, expectedNumber(check));
});

test.each(checksNamed('threshold-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const { massSun, luminositySun, densityGCm3 } = check.inputs as Record<string, number>;
  const expected = check.expected as Record<string, number>;
  const betaCritical = criticalBeta(releaseOf(check));
  expectWithin(check, betaCritical, expected.betaCritical);
  const radiusM = geometricBlowoutRadiusM({
    qpr: 1,
    densityKgM3: densityGCm3 * 1000,
    betaCritical,
    luminositySun,
    massSun,
  });
  expectWithin(check, radiusM * 1e6, expected.radiusUm);
});

test.each(checksNamed('sail-', 'flake-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const criticalGM2 = criticalSailDensityKgM2(sun) * 1000;
  const found: Record<string, number> = {
    'sail-sigma': criticalGM2,
    'sail-153': criticalGM2,
    'flake-faceon': betaOfAreaToMass({ qpr: 1, areaToMassM2Kg: 1 / (1e-6 * 2500), ...sun }),
    'sail-area-4600kg': 4600 / criticalSailDensityKgM2(sun),
  };
  expectWithin(check, found[check.id], expectedNumber(check));
});

describe('beta', () => {
  test('is proportional to L/M and Q, and to 1 over density and radius', () => {
    const factor = fc.double({ min: 0.01, max: 100, noNaN: true });
    fc.assert(
      fc.property(factor, factor, factor, factor, factor, (a, b, c, d, e) => {
        const scaled = betaOf({ qpr: a, radiusM: b * 1e-6, densityKgM3: c * 1000, massSun: d, luminositySun: e });
        expect(scaled / ((black(1, 1, stars.Sun) * a * e) / (b * c * d))).toBeCloseTo(1, 12);
      }),
    );
  });

  test('of a flat plate facing the star is one for a black plate and two for a mirror; edge-on it vanishes', () => {
    expect(plateEfficiency({ tiltRad: 0, specular: 0, diffuse: 0 })).toBe(1);
    expect(plateEfficiency({ tiltRad: 0, specular: 1, diffuse: 0 })).toBe(2);
    expect(plateEfficiency({ tiltRad: Math.PI / 2, specular: 0.5, diffuse: 0.2 })).toBeCloseTo(0, 15);
  });
});
