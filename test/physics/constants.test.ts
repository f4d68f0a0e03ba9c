import { expect, test } from 'vitest';
import { AU, GM_SUN, L_SUN, R_SUN, SIGMA_SB, TEFF_SUN_K } from '@/src/physics/constants';
import { checksNamed, expectedNumber, expectWithin, titleOf } from './optics-checks';

const values: Record<string, number> = {
  'const-sigma': SIGMA_SB,
  'const-gmsun': GM_SUN,
  'const-lsun': L_SUN,
  'const-au': AU,
};

test.each(checksNamed('const-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  expectWithin(check, values[check.id], expectedNumber(check));
});

test('the nominal solar radius and temperature give the nominal luminosity to 3e-6 [IAU 2015 Resolution B3]', () => {
  expect((4 * Math.PI * R_SUN ** 2 * SIGMA_SB * TEFF_SUN_K ** 4) / L_SUN).toBeCloseTo(0.9999976, 6);
});
