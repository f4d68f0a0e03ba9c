import fc from 'fast-check';
import { afterAll, expect, test } from 'vitest';
import { C2 } from '@/src/physics/constants';
import {
  buildCurve,
  CurveCancelled,
  decodeCurve,
  encodeCurve,
  qabsAt,
  qprAt,
  qprAtMany,
  type Curve,
} from '@/src/physics/curve';
import { constantOptics } from '@/src/physics/materials';
import type { Spectrum } from '@/src/physics/spectrum';
import { checksNamed, expectedNumber, expectWithin, indexOf, libraryOptics, numberOf, titleOf } from './optics-checks';

const sun: Spectrum = { kind: 'planck', teffK: 5772 };
const curveOf = (n: number, k: number, spectrum = sun): Curve => buildCurve({ core: constantOptics(n, k) }, spectrum);

let worst = { deviation: 0, id: '' };
afterAll(() => console.log(`curve: worst deviation from an independent mean ${worst.deviation} (${worst.id})`));
function note(id: string, deviation: number): void {
  if (deviation > worst.deviation) worst = { deviation, id };
}

test.each(checksNamed('qpr-mean-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const curve = curveOf(...indexOf(check), { kind: 'planck', teffK: numberOf(check, 'T') });
  note(check.id, expectWithin(check, qprAt(curve, numberOf(check, 's_um') * 1e-6), expectedNumber(check)));
});

const means = checksNamed('mean-qpr-');

test.each(means.filter(({ inputs }) => !('bandUm' in inputs)).map((check) => [titleOf(check), check] as const))(
  '%s',
  (_, check) => {
    const spectrum: Spectrum = { kind: 'planck', teffK: numberOf(check, 'teffK') };
    const curve = buildCurve({ core: libraryOptics(String(check.inputs.material)) }, spectrum);
    note(check.id, expectWithin(check, qprAt(curve, numberOf(check, 'sUm') * 1e-6), expectedNumber(check)));
  },
);

test.each(means.filter(({ inputs }) => 'bandUm' in inputs).map((check) => [titleOf(check), check] as const))(
  '%s',
  (_, check) => {
    const [fromUm, toUm] = check.inputs.bandUm as [number, number];
    const spectrum = blackBodyTable(numberOf(check, 'teffK'), fromUm, toUm);
    const curve = buildCurve({ core: libraryOptics(String(check.inputs.material)) }, spectrum);
    expectWithin(check, qprAt(curve, numberOf(check, 'sUm') * 1e-6), expectedNumber(check));
  },
);

function blackBodyTable(teffK: number, fromUm: number, toUm: number): Spectrum {
  const rows = 4000;
  const wavelengthUm = Array.from({ length: rows }, (_, row) => fromUm * (toUm / fromUm) ** (row / (rows - 1)));
  return {
    kind: 'table',
    wavelengthUm,
    flux: wavelengthUm.map((um) => um ** -5 / Math.expm1(C2 / (um * 1e-6 * teffK))),
  };
}

test('small absorbing grains: <Q_abs> = 8 pi s Im[(m2-1)/(m2+2)] <1/lambda>, <1/lambda> = 3.832229 T/c2 [Bohren & Huffman 5.11]', () => {
  const curve = curveOf(1.6, 0.5);
  // (m2-1)/(m2+2) with m2 = 2.31 + 1.6i: Im = 3 Im m2 / |m2 + 2|^2
  const polarisability = (3 * 1.6) / (4.31 ** 2 + 1.6 ** 2);
  const plain = (8 * Math.PI * 1e-9 * polarisability * 3.832229 * 5772) / C2;
  expect(Math.abs(qabsAt(curve, 1e-9) / plain - 1)).toBeLessThan(3e-4);
  expect(Math.abs(qprAt(curve, 1e-9) / plain - 1)).toBeLessThan(3e-4);
});

test('below 1 nm Q falls in proportion to the radius; above 1 cm it goes on smoothly to a limit', () => {
  const curve = curveOf(1.7, 0.03);
  expect(qprAt(curve, 2e-10) / qprAt(curve, 1e-9)).toBeCloseTo(0.2, 12);
  expect(qabsAt(curve, 2e-10) / qabsAt(curve, 1e-9)).toBeCloseTo(0.2, 12);
  expect(qprAt(curve, 1e-2 * (1 + 1e-9)) / qprAt(curve, 1e-2)).toBeCloseTo(1, 9);
  expect(Math.abs(qprAt(curve, 1) / qprAt(curve, 1e-2) - 1)).toBeLessThan(1e-3);
  expect(qprAt(curve, 1e3)).toBeCloseTo(qprAt(curve, 1), 5);
});

test('many radii at once are the single ones, also in place', () => {
  const curve = curveOf(1.7, 0.03);
  const radiiM = Float64Array.from([1e-10, 1e-9, 3.3e-7, 1e-2, 5]);
  const expected = Array.from(radiiM, (radiusM) => qprAt(curve, radiusM));
  qprAtMany(curve, radiiM, radiiM);
  expect([...radiiM]).toEqual(expected);
});

test('bytes give back exactly the same curve, from any place in a buffer; cut short they are refused', () => {
  const curve = buildCurve({ core: libraryOptics('carbon_be') }, { kind: 'planck', teffK: 20_000 });
  const bytes = encodeCurve(curve);
  expect(decodeCurve(bytes)).toEqual(curve);
  const shifted = new Uint8Array(bytes.length + 3);
  shifted.set(bytes, 3);
  expect(decodeCurve(shifted.subarray(3))).toEqual(curve);
  expect(() => decodeCurve(bytes.subarray(0, bytes.length / 2))).toThrow(RangeError);
});

test('progress never falls and ends at 1; a cancelled build stops', () => {
  const shares: number[] = [];
  buildCurve({ core: constantOptics(1.6, 0.5) }, sun, { onProgress: (share) => shares.push(share) });
  expect(shares.length).toBeGreaterThan(20);
  shares.slice(1).forEach((share, index) => expect(share).toBeGreaterThanOrEqual(shares[index]));
  expect(shares[shares.length - 1]).toBe(1);
  let asked = 0;
  const isCancelled = () => ++asked > 5;
  expect(() => buildCurve({ core: constantOptics(1.6, 0.5) }, sun, { isCancelled })).toThrow(CurveCancelled);
  expect(asked).toBe(6);
});

test('energy outside the vouched wavelengths is told [standard black-body table, from memory: 48.09 % below lambda T = 4000 um K]', () => {
  const curve = buildCurve({ core: libraryOptics('olivine_mgfe') }, { kind: 'planck', teffK: 20_000 });
  expect(curve.shareOutsideValidRange).toBeGreaterThan(0.475);
  expect(curve.shareOutsideValidRange).toBeLessThan(0.487);
  expect(curve.notes.join(' ')).toContain('48');
  expect(curveOf(1.6, 0.5).notes).toEqual([]);
});

test('with one index at all wavelengths only the product of radius and temperature counts, and Q_pr >= Q_abs > 0', () => {
  let largest = 0;
  fc.assert(
    fc.property(
      fc.double({ min: 1.2, max: 3, noNaN: true }),
      fc.double({ min: 0.1, max: 3, noNaN: true }),
      fc.double({ min: 2000, max: 60_000, noNaN: true }),
      fc.double({ min: Math.log(5e-9), max: Math.log(1e-3), noNaN: true }).map(Math.exp),
      (n, k, teffK, radiusM) => {
        const curve = curveOf(n, k, { kind: 'planck', teffK });
        const q = qprAt(curve, radiusM);
        const scaled = qprAt(curveOf(n, k), (radiusM * teffK) / 5772);
        largest = Math.max(largest, Math.abs(q / scaled - 1));
        expect(Math.abs(q / scaled - 1)).toBeLessThan(2e-4);
        expect(qabsAt(curve, radiusM)).toBeGreaterThan(0);
        expect(q).toBeGreaterThan(qabsAt(curve, radiusM) * (1 - 1e-3));
      },
    ),
    { numRuns: 12, seed: 4 },
  );
  console.log(`curve: largest deviation from the scaling with radius times temperature ${largest}`);
});

test('temperatures at both ends of the range give curves with honest bounds', () => {
  for (const teffK of [2000, 60_000]) {
    const curve = buildCurve({ core: libraryOptics('astrosil') }, { kind: 'planck', teffK });
    expect(curve.coefficients.every(Number.isFinite)).toBe(true);
    expect(curve.absorption.every(Number.isFinite)).toBe(true);
    expect(curve.relativeErrorBound).toBeLessThan(1e-3);
  }
});
