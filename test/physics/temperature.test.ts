import { describe, expect, test } from 'vitest';
import { AU, C2, L_SUN, SIGMA_SB } from '@/src/physics/constants';
import { buildCurve, qabsAt } from '@/src/physics/curve';
import { constantOptics, refractiveIndex, type Optics } from '@/src/physics/materials';
import { mieEfficiencies } from '@/src/physics/mie';
import { blackBodyTemperatureK, buildEmission, temperatureCurve } from '@/src/physics/temperature';
import { checksNamed, expectedNumber, expectWithin, libraryOptics, titleOf } from './optics-checks';

const sun = { kind: 'planck', teffK: 5772 } as const;

const [blackBody] = checksNamed('T-bb-1au');
test(titleOf(blackBody), () => {
  expectWithin(blackBody, blackBodyTemperatureK(1, 1), expectedNumber(blackBody));
});

const [absorber] = checksNamed('T-mie-01');
test(titleOf(absorber), () => {
  const recipe = { core: constantOptics(1.6, 0.5) };
  const temperature = temperatureCurve(buildCurve(recipe, sun), buildEmission(recipe), 1, 1);
  expectWithin(absorber, temperature(1e-7), expectedNumber(absorber));
});

describe('temperature', () => {
  const recipe = { core: libraryOptics('carbon_be') };
  const curve = buildCurve(recipe, sun);
  const emission = buildEmission(recipe);

  test('of large opaque grains is near the black body’s, small ones are hotter', () => {
    const at = temperatureCurve(curve, emission, 1, 1);
    expect(Math.abs(at(1e-3) / blackBodyTemperatureK(1, 1) - 1)).toBeLessThan(0.1);
    expect(at(1e-7)).toBeGreaterThan(1.3 * at(1e-3));
  });

  test('depends on luminosity over distance squared alone', () => {
    const near = temperatureCurve(curve, emission, 4, 2);
    const far = temperatureCurve(curve, emission, 1, 1);
    for (const radiusM of [1e-8, 1e-6, 1e-4]) expect(near(radiusM)).toBeCloseTo(far(radiusM), 8);
  });

  test('has no value beyond the table', () => {
    expect(temperatureCurve(curve, emission, 1e6, 1e-4)(1e-6)).toBeNaN();
  });
});

/** Planck mean of Q_abs by a direct sum, ten times denser than the engine's table. */
function denseMean(core: Optics, radiusM: number, temperatureK: number): number {
  let sum = 0;
  let weights = 0;
  for (let lnU = Math.log(1e-3); lnU < Math.log(60); lnU += 0.001) {
    const u = Math.exp(lnU);
    const wavelengthM = C2 / (u * temperatureK);
    const weight = u ** 4 / Math.expm1(u);
    for (const { weight: share, model } of core.components) {
      const q = mieEfficiencies((2 * Math.PI * radiusM) / wavelengthM, ...refractiveIndex(model, wavelengthM)).qAbs;
      sum += weight * share * q;
    }
    weights += weight;
  }
  return sum / weights;
}

test.each([
  ['enstatite_amorph', 7.56e-8, 0.05],
  ['sic', 9.05e-8, 0.05],
  ['corundum', 4.3e-8, 0.05],
  ['silica', 4.3e-8, 0.05],
  ['troilite_p94', 1.27e-5, 40],
])('%s of %s m at %s au keeps its balance, to 0.004 of the temperature', (id, radiusM, distanceAu) => {
  const recipe = { core: libraryOptics(id) };
  const curve = buildCurve(recipe, sun);
  const temperatureK = temperatureCurve(curve, buildEmission(recipe), 1, distanceAu)(radiusM);
  const takenIn = (qabsAt(curve, radiusM) * L_SUN) / (16 * Math.PI * (distanceAu * AU) ** 2 * SIGMA_SB);
  const givenOff = denseMean(recipe.core, radiusM, temperatureK) * temperatureK ** 4;
  expect(Math.abs((givenOff / takenIn) ** 0.25 - 1)).toBeLessThan(0.004);
});
