import { expect, test } from 'vitest';
import { mieEfficiencies } from '@/src/physics/mie';
import { rayOptics } from '@/src/physics/ray-optics';
import { checksNamed, expectedNumber, expectWithin, indexOf, titleOf } from './optics-checks';

const OPAQUE_SIZE = 1e9;
const MIRROR_INDEX = 1e12;

test.each(checksNamed('go-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const [n, k] = 'R' in check.inputs ? [MIRROR_INDEX, MIRROR_INDEX] : indexOf(check);
  const out = new Float64Array(2);
  rayOptics(n, k).at(out, OPAQUE_SIZE);
  expectWithin(check, out[0], expectedNumber(check));
});

test('Mie approaches it from x = 1000 to 10 000 for clear, absorbing, metallic and n < 1 spheres', () => {
  for (const [n, k] of [
    [1.5, 1e-4],
    [1.5, 0.1],
    [3, 4],
    [0.7, 1],
    [0.6, 0.05],
  ]) {
    const [far, near] = [1e4, 1e3].map((x) => {
      const out = new Float64Array(2);
      rayOptics(n, k).at(out, x);
      return Math.abs(smoothedMie(x, n, k) - out[0]);
    });
    expect(far, `m = ${n} + ${k}i`).toBeLessThan(0.0015);
    expect(far, `m = ${n} + ${k}i`).toBeLessThan(near / 4);
  }
});

/** Mean over 3 % on each side of x, which takes out the ripple. */
function smoothedMie(x: number, n: number, k: number): number {
  const samples = 51;
  let sum = 0;
  for (let index = 0; index < samples; index++)
    sum += mieEfficiencies(x * (0.97 + (0.06 * index) / (samples - 1)), n, k).qPr;
  return sum / samples;
}
