import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { coatedEfficiencies, coreRadiusShare, meanDensityOfCoated } from '@/src/physics/mantle';
import { mieEfficiencies } from '@/src/physics/mie';
import { bruggemanTwo, epsToIndex, indexToEps, maxwellGarnett, porousIndex } from '@/src/physics/mixtures';
import { checksNamed, expectedNumber, expectWithin, numberOf, titleOf, type Check } from './optics-checks';

const pair = (check: Check, name: string): [number, number] => {
  const value = check.inputs[name];
  return Array.isArray(value) ? [Number(value[0]), Number(value[1])] : [Number(value), 0];
};

test.each(checksNamed('brug-', 'mg-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const values: Record<string, () => number> = {
    'brug-41-half': () => bruggemanTwo([4, 0], [1, 0], 0.5)[0],
    'brug-por50-n': () => porousIndex([1.7, 0.03], 0.5, 'bruggeman')[0],
    'brug-por50-k': () => porousIndex([1.7, 0.03], 0.5, 'bruggeman')[1],
    'mg-por50-n': () => porousIndex([1.7, 0.03], 0.5, 'maxwellGarnett')[0],
  };
  expectWithin(check, values[check.id](), expectedNumber(check));
});

test.each(checksNamed('bruggeman-', 'maxwell-garnett-').map((check) => [titleOf(check), check] as const))(
  '%s',
  (_, check) => {
    const [eps1, eps2] = [pair(check, 'eps1'), pair(check, 'eps2')];
    const found = check.id.startsWith('bruggeman')
      ? bruggemanTwo(eps1, eps2, numberOf(check, 'fraction1'))
      : maxwellGarnett(eps1, eps2, numberOf(check, 'fraction2'));
    (check.expected as unknown as number[]).forEach((expected, part) => expectWithin(check, found[part], expected));
  },
);

test.each(checksNamed('coat-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const [core, mantle] = [pair(check, 'm_core'), pair(check, 'm_mantle')];
  expectWithin(
    check,
    coatedEfficiencies(numberOf(check, 'x_core'), numberOf(check, 'x_total'), ...core, ...mantle).qPr,
    expectedNumber(check),
  );
});

describe('mixtures', () => {
  const n = fc.double({ min: 0.3, max: 6, noNaN: true });
  const k = fc.oneof(fc.constant(0), fc.double({ min: 1e-6, max: 5, noNaN: true }));
  const index = fc.tuple(n, k);
  const share = fc.double({ min: 0, max: 1, noNaN: true });

  test('take the passive root where the other sign would be taken for granted (metal at 90 %)', () => {
    // SPEC 3.7: eps1 = -10 + i, eps2 = 1, f1 = 0.9 has the roots -8.2437 + 0.8520i and -0.606 - 0.0020i.
    const [re, im] = bruggemanTwo([-10, 1], [1, 0], 0.9);
    expect(re).toBeCloseTo(-8.2437, 4);
    expect(im).toBeCloseTo(0.852, 4);
  });

  test.each([0, 1e-13, 1e-10])(
    'keep the loss that a metal without loss of its own (share %s) gains by mixing',
    (loss) => {
      // By hand: b = (3 * 0.2 - 1)(-9) + (3 * 0.8 - 1) = 5, b^2 + 8 (-9) = -47, eps = (5 + i sqrt 47)/4.
      const [re, im] = bruggemanTwo([-9, 9 * loss], [1, 0], 0.2);
      expect(re).toBeCloseTo(1.25, 8);
      expect(im).toBeCloseTo(Math.sqrt(47) / 4, 8);
    },
  );

  test('solve their own equation and never amplify light', () => {
    fc.assert(
      fc.property(index, index, share, (a, b, fraction) => {
        const [epsA, epsB] = [indexToEps(a), indexToEps(b)];
        const eps = bruggemanTwo(epsA, epsB, fraction);
        expect(eps[1]).toBeGreaterThanOrEqual(0);
        const term = (phase: [number, number]) => {
          const [dr, di] = [phase[0] + 2 * eps[0], phase[1] + 2 * eps[1]];
          const d2 = dr * dr + di * di;
          const [nr, ni] = [phase[0] - eps[0], phase[1] - eps[1]];
          return [(nr * dr + ni * di) / d2, (ni * dr - nr * di) / d2];
        };
        const [ta, tb] = [term(epsA), term(epsB)];
        const residual = Math.hypot(
          fraction * ta[0] + (1 - fraction) * tb[0],
          fraction * ta[1] + (1 - fraction) * tb[1],
        );
        expect(residual).toBeLessThan(1e-7);
      }),
    );
  });

  test('of one material with itself are that material', () => {
    fc.assert(
      fc.property(index, share, (m, fraction) => {
        const eps = indexToEps(m);
        for (const mixed of [bruggemanTwo(eps, eps, fraction), maxwellGarnett(eps, eps, fraction)]) {
          const [n2, k2] = epsToIndex(mixed);
          expect(n2).toBeCloseTo(m[0], 8);
          expect(k2).toBeCloseTo(m[1], 8);
        }
      }),
    );
  });
});

describe('a mantle', () => {
  const light: [number, number, number][] = [
    [0.01, 1.7, 0.03],
    [1, 3, 4],
    [30, 1.31, 1e-8],
    [300, 1.7, 0.5],
    [1000, 2, 0.8],
  ];

  test.each(light)(
    'at x = %s, m = %s + %si: of the core’s own stuff, or around a vanishing core, is a homogeneous sphere',
    (x, n, k) => {
      const { qPr, qAbs } = mieEfficiencies(x, n, k);
      // A share of 1e-12 in k keeps the shortcut for equal materials out of the way.
      const same = coatedEfficiencies(0.8 * x, x, n, k, n, k * (1 + 1e-12) + 1e-300);
      expect(same.qPr / qPr).toBeCloseTo(1, 9);
      expect(same.qAbs / qAbs).toBeCloseTo(1, 7);
      expect(coatedEfficiencies(1e-4 * x, x, 5, 5, n, k).qPr / qPr).toBeCloseTo(1, 8);
      expect(coatedEfficiencies(x * (1 - 1e-9), x, n, k, 1.31, 1e-8).qPr / qPr).toBeCloseTo(1, 6);
    },
  );

  test.each([1e-9, 2e-8, 1e-6, 1e-4])(
    'around a grain far smaller than the wavelength (x = %s) keeps the small-particle laws',
    (x) => {
      const { qAbs, qPr } = mieEfficiencies(x, 1.7, 0.03);
      const coated = coatedEfficiencies(0.9 * x, x, 1.7, 0.03, 1.7, 0.03 * (1 + 1e-12));
      expect(coated.qAbs / qAbs).toBeCloseTo(1, 7);
      expect(coated.qPr / qPr).toBeCloseTo(1, 7);
    },
  );

  test.each([
    [1e-4, 0.5, [2, 0.8], [1.7, 0.03]],
    [1e-5, 0.9, [0.8, 0.01], [1.7, 0.03]],
    [1e-5, 0.001, [1, 0], [0.8, 0.01]],
    [1e-7, 0.5, [2, 0.8], [1.7, 0.03]],
  ] as [number, number, [number, number], [number, number]][])(
    'around a core in a slowly varying field (x = %s, radii %s, %s in %s) absorbs as electrostatics says [Bohren & Huffman 5.36]',
    (x, share, core, mantle) => {
      const { qAbs } = coatedEfficiencies(share * x, x, ...core, ...mantle);
      expect(qAbs / (4 * x * electrostaticLoss(share ** 3, indexToEps(core), indexToEps(mantle)))).toBeCloseTo(1, 6);
    },
  );

  test('changes the density by its share of the volume', () => {
    expect(meanDensityOfCoated({ coreKgM3: 3300, mantleKgM3: 900, mantleVolumeFraction: 0.5 })).toBe(2100);
    expect(coreRadiusShare(7 / 8)).toBeCloseTo(0.5, 15);
  });
});

/** Im of the polarisability of a coated sphere over 3 volumes (Bohren & Huffman 1983, eq. 5.36). */
function electrostaticLoss(fraction: number, [a, b]: [number, number], [c, d]: [number, number]): number {
  const times = (p: number[], q: number[]) => [p[0] * q[0] - p[1] * q[1], p[0] * q[1] + p[1] * q[0]];
  const plus = (p: number[], q: number[], factor = 1) => [p[0] + factor * q[0], p[1] + factor * q[1]];
  const inner = plus([a, b], [c, d], 2);
  const contrast = plus([a, b], [c, d], -1);
  const top = plus(times([c - 1, d], inner), times(contrast, [1 + 2 * c, 2 * d]), fraction);
  const bottom = plus(times([c + 2, d], inner), times([2 * c - 2, 2 * d], contrast), fraction);
  return (top[1] * bottom[0] - top[0] * bottom[1]) / (bottom[0] ** 2 + bottom[1] ** 2);
}
