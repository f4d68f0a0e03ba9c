import { expect, test } from 'vitest';
import { buildCurve, qabsAt, qprAt, type Curve } from '@/src/physics/curve';
import { constantOptics, refractiveIndex, type OpticsRecipe, type TabulatedIndex } from '@/src/physics/materials';
import type { Spectrum } from '@/src/physics/spectrum';
import { checksNamed, expectedNumber, libraryOptics, titleOf } from './optics-checks';

const sun: Spectrum = { kind: 'planck', teffK: 5772 };
const radiiUm = [0.002, 0.03, 0.1, 0.3, 1, 3, 10, 50, 400];
const curveOf = (recipe: OpticsRecipe, spectrum = sun): Curve => buildCurve(recipe, spectrum);

/** Largest relative difference of both efficiencies over the radii. */
function difference(a: Curve, b: Curve): number {
  return Math.max(
    ...radiiUm.flatMap((um) => [
      Math.abs(qprAt(a, um * 1e-6) / qprAt(b, um * 1e-6) - 1),
      Math.abs(qabsAt(a, um * 1e-6) / qabsAt(b, um * 1e-6) - 1),
    ]),
  );
}

const [bruggemanN] = checksNamed('brug-por50-n');
const [bruggemanK] = checksNamed('brug-por50-k');
const [garnettN] = checksNamed('mg-por50-n');

test(`half voids by Bruggeman act as a body of the mixed index: ${titleOf(bruggemanN)}, ${titleOf(bruggemanK)}`, () => {
  const porous = curveOf({ core: constantOptics(1.7, 0.03), porosity: 0.5 });
  const mixed = curveOf({ core: constantOptics(expectedNumber(bruggemanN), expectedNumber(bruggemanK)) });
  expect(difference(porous, mixed)).toBeLessThan(1e-6);
});

test(`half voids by Maxwell Garnett are inclusions in the solid: ${titleOf(garnettN)}, k of SPEC 3.7 is 0.015651`, () => {
  const porous = curveOf({ core: constantOptics(1.7, 0.03), porosity: 0.5, mixing: 'maxwellGarnett' });
  const mixed = curveOf({ core: constantOptics(expectedNumber(garnettN), 0.015651) });
  expect(difference(porous, mixed)).toBeLessThan(1e-4);
});

test('without voids both mixing rules leave a solid as it is', () => {
  const solid = curveOf({ core: libraryOptics('organics') });
  for (const mixing of ['bruggeman', 'maxwellGarnett'] as const)
    expect(difference(curveOf({ core: libraryOptics('organics'), porosity: 0, mixing }), solid)).toBe(0);
});

test('a mantle of the core material changes nothing', () => {
  const core = constantOptics(1.7, 0.1);
  const coated = curveOf({ core, mantle: { optics: core, volumeFraction: 0.4 } });
  expect(difference(coated, curveOf({ core }))).toBeLessThan(4e-4);
});

test('a vanishing mantle leaves the core, one that fills the grain leaves the mantle', () => {
  const core = constantOptics(1.7, 0.3);
  const mantle = constantOptics(1.4, 0.2);
  const thin = curveOf({ core, mantle: { optics: mantle, volumeFraction: 1e-9 } });
  const thick = curveOf({ core, mantle: { optics: mantle, volumeFraction: 1 - 1e-6 } });
  const bare = curveOf({ core });
  const mantleAlone = curveOf({ core: mantle });
  for (const radiusM of radiiUm.filter((um) => um < 50).map((um) => um * 1e-6)) {
    expect(qprAt(thin, radiusM) / qprAt(bare, radiusM)).toBeCloseTo(1, 3);
    expect(qprAt(thick, radiusM) / qprAt(mantleAlone, radiusM)).toBeCloseTo(1, 3);
  }
});

test('components are averaged with their weights', () => {
  const graphite = libraryOptics('graphite');
  const whole = curveOf({ core: graphite });
  const parts = graphite.components.map((component) => ({
    weight: component.weight,
    curve: curveOf({ core: { ...graphite, components: [{ ...component, weight: 1 }] } }),
  }));
  expect(parts).toHaveLength(2);
  for (const um of radiiUm) {
    const mean = parts.reduce((sum, { weight, curve }) => sum + weight * qprAt(curve, um * 1e-6), 0);
    expect(Math.abs(qprAt(whole, um * 1e-6) / mean - 1)).toBeLessThan(2e-4);
  }
});

test('a table of the oscillator model is worth the model', () => {
  const model = libraryOptics('carbon_be');
  const wavelengthUm = Array.from({ length: 2000 }, (_, row) => 0.02 * 5e4 ** (row / 1999));
  const rows = wavelengthUm.map((um) => refractiveIndex(model.components[0].model, um * 1e-6));
  const table: TabulatedIndex = { kind: 'table', wavelengthUm, n: rows.map(([n]) => n), k: rows.map(([, k]) => k) };
  const tabulated = curveOf({ core: { components: [{ weight: 1, model: table }], validUm: [0.02, 1000] } });
  expect(difference(tabulated, curveOf({ core: model }))).toBeLessThan(2e-4);
});

test('a recipe is vouched for where core and mantle both are', () => {
  const core = { ...constantOptics(1.7, 0.3), validUm: [0.4, 0.7] as [number, number] };
  const optics = { ...constantOptics(1.7, 0.3), validUm: [0.1, 100] as [number, number] };
  const { shareOutsideValidRange } = curveOf({ core, mantle: { optics, volumeFraction: 0.5 } });
  const [visible] = checksNamed('planck-sun-vis');
  expect(shareOutsideValidRange, titleOf(visible)).toBeCloseTo(1 - expectedNumber(visible), 2);
});
