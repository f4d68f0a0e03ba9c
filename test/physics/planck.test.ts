import { expect, test } from 'vitest';
import { C2 } from '@/src/physics/constants';
import { planckFractionBelow } from '@/src/physics/planck-fraction';
import { spectralGrid } from '@/src/physics/spectrum';
import { checksNamed, expectedNumber, expectWithin, titleOf } from './optics-checks';

const found: Record<string, () => number> = {
  'planck-peak': () => planckFractionBelow(2897.771955e-6 / 5772, 5772),
  'planck-sun-vis': () => planckFractionBelow(0.7e-6, 5772) - planckFractionBelow(0.4e-6, 5772),
};

test.each(checksNamed('planck-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  expectWithin(check, found[check.id](), expectedNumber(check));
});

test('both series of the fraction meet at u = 1', () => {
  const at = (u: number) => planckFractionBelow(C2 / u, 1);
  const slope = (15 / Math.PI ** 4 / Math.expm1(1)) * 2e-9;
  expect(at(1 - 1e-9) - at(1 + 1e-9) - slope).toBeLessThan(1e-10);
});

test.each([2000, 5772, 60_000])('the grid at %i K leaves out at most 1e-6 of the energy on each side', (teffK) => {
  const { wavelengthM } = spectralGrid({ kind: 'planck', teffK }, 2);
  expect(planckFractionBelow(wavelengthM[0], teffK)).toBeLessThan(1e-6);
  expect(1 - planckFractionBelow(wavelengthM[wavelengthM.length - 1], teffK)).toBeLessThan(1e-6);
});

test('mean photon energy of a black body is 360 zeta(5)/pi^4 = 3.832229 kT on every level from 64 wavelengths', () => {
  const grid = spectralGrid({ kind: 'planck', teffK: 5772 }, 6);
  const levels = grid.weights.map((weights, level) => {
    const stride = 1 << (grid.weights.length - 1 - level);
    return weights.reduce((sum, weight, index) => sum + (weight * C2) / (grid.wavelengthM[index * stride] * 5772), 0);
  });
  for (const mean of levels.slice(1)) expect(Math.abs(mean - 3.832229)).toBeLessThan(2e-6);
});

test('a tabulated black body has the weights of the formula, and its lines keep their energy on coarse levels', () => {
  const rows = Array.from({ length: 3000 }, (_, row) => 0.1 * Math.exp((row / 2999) * Math.log(1000)));
  const planck = rows.map((um) => um ** -5 / Math.expm1(C2 / (um * 1e-6 * 5772)));
  const plain = spectralGrid({ kind: 'table', wavelengthUm: rows, flux: planck }, 6);
  const mean = plain.weights[5].reduce(
    (sum, weight, index) => sum + (weight * C2) / (plain.wavelengthM[index] * 5772),
    0,
  );
  expect(Math.abs(mean / 3.832229 - 1)).toBeLessThan(1e-4);

  const line = Math.floor(rows.length / 3);
  const spiked = planck.map((flux, row) => (row === line ? flux * 50 : flux));
  const energy = (flux: number[]) =>
    flux.slice(1).reduce((sum, value, row) => sum + 0.5 * (value + flux[row]) * (rows[row + 1] - rows[row]), 0);
  const withLine = spectralGrid({ kind: 'table', wavelengthUm: rows, flux: spiked }, 6);
  const coarseMean = withLine.weights[2].reduce(
    (sum, weight, index) => sum + weight * withLine.wavelengthM[index * 8],
    0,
  );
  const exact =
    spiked.slice(1).reduce((sum, value, row) => {
      const [a, b] = [rows[row], rows[row + 1]];
      return sum + ((b - a) / 6) * (spiked[row] * (2 * a + b) + value * (a + 2 * b));
    }, 0) / energy(spiked);
  expect(Math.abs(coarseMean / (exact * 1e-6) - 1)).toBeLessThan(1e-9);
});
