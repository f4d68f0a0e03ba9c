import { describe, expect, test } from 'vitest';
import { buildCurve } from '@/src/physics/curve';
import { constantOptics } from '@/src/physics/materials';
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
