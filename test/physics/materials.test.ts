import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { dawson } from '@/src/physics/dawson';
import { refractiveIndex, tabulateIndex, type TabulatedIndex } from '@/src/physics/materials';
import { library, libraryOptics } from './optics-checks';

interface SpotValue {
  lambda_um: number;
  n: number;
  k: number;
  model_n: number;
  model_k: number;
  component?: string;
}

const spots = JSON.parse(readFileSync(new URL('./spotvalues.json', import.meta.url), 'utf8')) as {
  materials: Record<string, { citation: string; values: SpotValue[] }>;
};

/** Printed to four decimals or digits: half a unit in the last place, and the photon energy constant's rounding. */
const PRINTED = 6e-5;

test.each(Object.entries(spots.materials).map(([id, { citation, values }]) => [id, citation, values] as const))(
  'oscillator model of %s gives the quoted n and k of the fit [%s]',
  (id, _, values) => {
    const optics = libraryOptics(id);
    for (const spot of values) {
      const [n, k] = refractiveIndex(componentOf(id, optics.components, spot).model, spot.lambda_um * 1e-6);
      expect(Math.abs(n - spot.model_n), `n at ${spot.lambda_um} um`).toBeLessThan(PRINTED + 3e-4 * spot.model_n);
      expect(Math.abs(k - spot.model_k), `k at ${spot.lambda_um} um`).toBeLessThan(PRINTED + 3e-3 * spot.model_k);
    }
  },
);

function componentOf<T>(id: string, components: T[], { component }: SpotValue): T {
  const entry = library.find((material) => material.id === id);
  const position = entry?.components.findIndex(({ label }) => label === component) ?? -1;
  return components[position < 0 ? 0 : position];
}

test('the fits stand near the published tables: n within 10 %, in 0.2 to 3 um, for all but the inconsistent FeS set', () => {
  let worst = 0;
  for (const [id, { values }] of Object.entries(spots.materials)) {
    if (id === 'troilite_p94') continue;
    for (const spot of values.filter(({ lambda_um }) => lambda_um >= 0.2 && lambda_um <= 3)) {
      const { model } = componentOf(id, libraryOptics(id).components, spot);
      const deviation = Math.abs(refractiveIndex(model, spot.lambda_um * 1e-6)[0] / spot.n - 1);
      worst = Math.max(worst, deviation);
      expect(deviation, `${id} at ${spot.lambda_um} um`).toBeLessThan(0.1);
    }
  }
  console.log(`materials: worst deviation of n from a published row, 0.2-3 um: ${worst}`);
});

test('every library material absorbs at every wavelength from 0.05 to 300 um', () => {
  for (const { id } of library) {
    for (const { model } of libraryOptics(id).components) {
      for (let um = 0.05; um < 300; um *= 1.07) {
        const [n, k] = refractiveIndex(model, um * 1e-6);
        expect(n, `${id} at ${um}`).toBeGreaterThan(0);
        expect(k, `${id} at ${um}`).toBeGreaterThanOrEqual(0);
      }
    }
  }
});

test("Dawson's integral: values from memory of the standard tables, odd, and F' = 1 - 2xF", () => {
  expect(dawson(0.5)).toBeCloseTo(0.4244363835020223, 12);
  expect(dawson(1)).toBeCloseTo(0.5380795069127684, 12);
  expect(dawson(10)).toBeCloseTo(0.05025384718759853, 12);
  for (const x of [0.05, 0.19, 0.21, 0.924, 3.3, 12, 49.9, 50.1, 300]) {
    expect(dawson(-x)).toBe(-dawson(x));
    const h = 1e-3;
    const slope = (8 * (dawson(x + h) - dawson(x - h)) - (dawson(x + 2 * h) - dawson(x - 2 * h))) / (12 * h);
    expect(Math.abs(slope - (1 - 2 * x * dawson(x))), `x = ${x}`).toBeLessThan(1e-9);
  }
});

test('a table is linear in n and ln k against ln wavelength, exact at its rows, clamped outside', () => {
  const table: TabulatedIndex = { kind: 'table', wavelengthUm: [0.5, 2], n: [1.5, 1.7], k: [1e-4, 1e-2] };
  expect(refractiveIndex(table, 0.1e-6)).toEqual([1.5, 1e-4]);
  expect(refractiveIndex(table, 50e-6)).toEqual([1.7, 1e-2]);
  const [n, k] = refractiveIndex(table, 1e-6);
  expect(n).toBeCloseTo(1.6, 12);
  expect(k).toBeCloseTo(1e-3, 12);
});

test('a table that prints k = 0 is linear in k there', () => {
  const table: TabulatedIndex = { kind: 'table', wavelengthUm: [1, 4], n: [1, 1], k: [0, 0.2] };
  expect(refractiveIndex(table, 2e-6)[1]).toBeCloseTo(0.1, 12);
});

test('many wavelengths at once are the single ones', () => {
  const [{ model }] = libraryOptics('astrosil').components;
  const wavelengths = Float64Array.from([0.2e-6, 1e-6, 10e-6]);
  const { n, k } = tabulateIndex(model, wavelengths);
  wavelengths.forEach((wavelengthM, row) => expect([n[row], k[row]]).toEqual(refractiveIndex(model, wavelengthM)));
});
