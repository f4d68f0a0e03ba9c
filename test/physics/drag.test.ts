import { describe, expect, test } from 'vitest';
import { chargeFlag, chargePerMass, lorentzRatio } from '@/src/physics/charge';
import { discCollisionTimeYr, interplanetaryFluxPerM2Yr } from '@/src/physics/collisions';
import { prTimeCircularYr, prTimeYr, windFactors } from '@/src/physics/drag';
import { betaOf } from '@/src/physics/beta';
import { regimeOf } from '@/src/physics/fate';
import { checksNamed, expectedNumber, expectWithin, numberOf, titleOf, type Check } from './optics-checks';

const circular = (radiusAu: number, beta: number) => prTimeCircularYr({ fromAu: radiusAu, beta, massSun: 1 });
const wind = windFactors({ massLossSunPerYr: 2e-14, speedKmS: 400, qsw: 1, qpr: 1, luminositySun: 1 });

const values: Record<string, (check: Check) => number> = {
  'pr-400': () => circular(1, 1),
  'pr-circ-01': () => circular(1, 0.1),
  'pr-ecc-05': () => prTimeYr({ semiMajorAxisAu: 1, eccentricity: 0.5, beta: 0.1, massSun: 1 }),
  'pr-7e6': () => circular(1, betaOf({ qpr: 1, radiusM: 1e-6, densityKgM3: 1000, massSun: 1, luminositySun: 1 })),
  'wind-drag': () => wind.dragRatio,
  'wind-press': () => wind.pressureRatio,
  'tcoll-disc': () => discCollisionTimeYr({ distanceAu: 1, massSun: 1, opticalDepth: 1e-3 }),
  'lorentz-pub': () =>
    lorentzRatio({
      potentialV: 10,
      fieldNT: 5 * Math.SQRT1_2,
      radiusM: 1e-7,
      densityKgM3: 3500,
      distanceAu: 1,
      massSun: 1,
      windSpeedKmS: 400,
    }),
  'qm-10nm': () => chargePerMass({ potentialV: 5, radiusM: 1e-8, densityKgM3: 2500 }),
};
const ellipse = (check: Check) =>
  prTimeYr({
    semiMajorAxisAu: numberOf(check, 'aAu'),
    eccentricity: numberOf(check, 'e'),
    beta: numberOf(check, 'beta'),
    massSun: numberOf(check, 'massSun'),
  });
const flux = (check: Check) => interplanetaryFluxPerM2Yr(numberOf(check, 'm_g'));

test.each(
  checksNamed('pr-', 'wind-', 'tcoll-', 'lorentz-', 'qm-', 'grun-').map((check) => [titleOf(check), check] as const),
)('%s', (_, check) => {
  const byFamily = check.id.startsWith('pr-ellipse') ? ellipse : flux;
  expectWithin(check, (values[check.id] ?? byFamily)(check), expectedNumber(check));
});

/** Time from the ODE of Wyatt & Whipple in e, integrated by Simpson's rule in e = e0 y^(5/8): no hypergeometric function. */
function integrated(semiMajorAxisAu: number, e0: number, beta: number): number {
  const steps = 20_000;
  const integrand = (y: number) => (1 - (e0 * y ** 0.625) ** 2) ** -1.5;
  let sum = integrand(0) + integrand(1);
  for (let index = 1; index < steps; index += 1) sum += (index % 2 === 1 ? 4 : 2) * integrand(index / steps);
  const integral = (sum / (3 * steps)) * 0.625 * e0 ** 1.6;
  const constant = semiMajorAxisAu * (1 - e0 * e0) * e0 ** -0.8;
  // circular(r, beta) = r^2/(4 alpha), so 2 C^2/(5 alpha) = 1.6 * circular(C).
  return 1.6 * circular(constant, beta) * integral;
}

describe('drag', () => {
  test.each([0.05, 0.3, 0.6, 0.707, 0.71, 0.9, 0.99])(
    'time at eccentricity %s is the integral of the orbit’s decay',
    (eccentricity) => {
      expect(
        prTimeYr({ semiMajorAxisAu: 2, eccentricity, beta: 0.2, massSun: 1 }) / integrated(2, eccentricity, 0.2),
      ).toBeCloseTo(1, 7);
    },
  );

  test('of a circle is the limit of ellipses', () => {
    expect(prTimeYr({ semiMajorAxisAu: 1, eccentricity: 0, beta: 0.1, massSun: 1 })).toBeCloseTo(circular(1, 0.1), 9);
  });
});

describe('what ends a grain’s stay', () => {
  test('is blow-out whenever it acts, else the shorter time, drag without a disc', () => {
    expect(regimeOf({ isUnbound: true, dragTimeYr: null, collisionTimeYr: 1 })).toBe('unbound');
    expect(regimeOf({ isUnbound: false, dragTimeYr: 10, collisionTimeYr: 1 })).toBe('collisions');
    expect(regimeOf({ isUnbound: false, dragTimeYr: 1, collisionTimeYr: 10 })).toBe('drag');
    expect(regimeOf({ isUnbound: false, dragTimeYr: 1, collisionTimeYr: null })).toBe('drag');
  });

  test('flags charge against what is left of gravity', () => {
    expect([chargeFlag(0.05, 0), chargeFlag(0.2, 0), chargeFlag(2, 0), chargeFlag(0.05, 0.99)]).toEqual([
      'none',
      'important',
      'unreliable',
      'important',
    ]);
  });
});
