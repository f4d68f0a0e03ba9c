import { describe, expect, test } from 'vitest';
import { histogramEdgesM } from '@/src/physics/histogram';
import { normalCdf } from '@/src/physics/normal';
import { lnSigmaOfMassFactor, prepareProbability } from '@/src/physics/probability';
import { powerLawIndex, powerLawShareBelow, sizeIndexOfMassIndex } from '@/src/physics/power-law';
import { effectiveRows, wilsonInterval } from '@/src/physics/wilson';
import { checksNamed, expectedNumber, expectWithin, numberOf, titleOf } from './optics-checks';

const sun = { massSun: 1, luminositySun: 1, betaCritical: 0.5 };
const black = prepareProbability(() => 1, sun);

test.each(checksNamed('wilson-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const [low, high] = wilsonInterval(numberOf(check, 'k') / numberOf(check, 'n'), numberOf(check, 'n'));
  expectWithin(check, check.id.endsWith('lo') ? low : high, expectedNumber(check));
});

test.each(checksNamed('p-unbound-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const { sUm, sSigmaUm, densityGCm3, densitySigma } = check.inputs as Record<string, number>;
  expectWithin(
    check,
    black(sUm * 1e-6, sSigmaUm * 1e-6, densityGCm3 * 1000, densitySigma * 1000),
    expectedNumber(check),
  );
});

test.each(checksNamed('punb-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const radiusM = numberOf(check, 's_median_um') * 1e-6;
  const sigmaM = radiusM * Math.sqrt(Math.expm1(numberOf(check, 'sigma_ln') ** 2));
  const densitySigma = typeof check.inputs.sigma_rho_gcc === 'number' ? check.inputs.sigma_rho_gcc * 1000 : 0;
  expectWithin(check, black(radiusM, sigmaM, numberOf(check, 'rho_gcc') * 1000, densitySigma), expectedNumber(check));
});

test.each(checksNamed('meb').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  expectWithin(check, lnSigmaOfMassFactor(numberOf(check, 'MEF')), expectedNumber(check));
});

test.each(checksNamed('mle-', 'powerlaw-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const sizes = (check.inputs.s ?? check.inputs.data) as number[];
  const [min, max] = [check.inputs.smin ?? check.inputs.min, check.inputs.smax ?? check.inputs.max].map((limit) =>
    limit === undefined ? undefined : Number(limit),
  );
  const { index, standardError } = powerLawIndex(sizes, min!, max);
  expectWithin(check, check.id === 'mle-err' ? standardError : index, expectedNumber(check));
});

test.each(checksNamed('frac-', 'doh-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  if (check.id === 'doh-conv')
    return void expectWithin(check, sizeIndexOfMassIndex(numberOf(check, 'q_m')), expectedNumber(check));
  const moment = check.id.endsWith('area') ? 2 : 0;
  const share = powerLawShareBelow(
    numberOf(check, 'sc_um'),
    { index: 3.5, min: numberOf(check, 'smin_um'), max: numberOf(check, 'smax_um') },
    moment,
  );
  expectWithin(check, share, expectedNumber(check));
});

describe('P(unbound)', () => {
  /** A window: unbound between about 0.06 and 0.6 um at 2.5 g/cm3. */
  const window = (radiusM: number) => 1.3 / (1 + (1.2e-7 / radiusM) ** 3);
  const dense = (
    qprAt: (radiusM: number) => number,
    radiusM: number,
    sigmaM: number,
    density: number,
    sigmaDensity: number,
  ) => {
    const lnSigma = Math.sqrt(Math.log1p((sigmaM / radiusM) ** 2));
    const steps = 2000;
    let sum = 0;
    let weights = 0;
    for (let i = 0; i < steps; i += 1) {
      const zs = -8 + (16 * (i + 0.5)) / steps;
      const s = radiusM * Math.exp(lnSigma * zs);
      // 3 L/(16 pi GM c) of the nominal Sun (checks.json, beta-K).
      const limit = (0.0005742367612423301 * qprAt(s)) / (0.5 * s);
      for (let j = 0; j < 400; j += 1) {
        const zd = -6 + (12 * (j + 0.5)) / 400;
        const rho = density + sigmaDensity * zd;
        if (rho <= 0) continue;
        const weight = Math.exp(-0.5 * (zs * zs + zd * zd));
        weights += weight;
        if (rho <= limit) sum += weight;
      }
    }
    return sum / weights;
  };

  test.each([
    [0.3e-6, 0.1e-6, 2500, 300],
    [0.62e-6, 0.05e-6, 2500, 100],
    [0.06e-6, 0.02e-6, 2500, 700],
    [1e-6, 1e-6, 1500, 400],
  ])('of a window agrees with a dense two-dimensional sum: s = %s m', (radiusM, sigmaM, density, sigmaDensity) => {
    const found = prepareProbability(window, sun)(radiusM, sigmaM, density, sigmaDensity);
    // The sum itself is good to about one of its 400 steps in density.
    expect(Math.abs(found - dense(window, radiusM, sigmaM, density, sigmaDensity))).toBeLessThan(1.5e-3);
  });

  test('goes over smoothly to the case without a density error', () => {
    const probability = prepareProbability(window, sun);
    for (const radiusM of [0.05e-6, 0.2e-6, 0.6e-6, 2e-6]) {
      const difference = probability(radiusM, 0.2 * radiusM, 2500, 0.05) - probability(radiusM, 0.2 * radiusM, 2500, 0);
      expect(Math.abs(difference)).toBeLessThan(1e-5);
    }
  });

  test('without any error is one or zero, equality counting as unbound', () => {
    expect(black(0.1e-6, 0, 2500, 0)).toBe(1);
    expect(black(1e-6, 0, 2500, 0)).toBe(0);
  });
});

describe('statistics', () => {
  test('normal distribution as tabulated (NIST/SEMATECH e-Handbook 1.3.6.7.1)', () => {
    expect(normalCdf(1)).toBeCloseTo(0.841344746068543, 14);
    expect(normalCdf(-3)).toBeCloseTo(0.00134989803163009, 15);
    expect(normalCdf(0)).toBeCloseTo(0.5, 15);
  });

  test('rows of equal weight count fully, one heavy row counts alone', () => {
    expect(effectiveRows(10, 10)).toBe(10);
    expect(effectiveRows(1e9 + 9, 1e18 + 9)).toBeCloseTo(1, 6);
    expect(effectiveRows(0, 0)).toBe(0);
  });

  test('a histogram spans the population with 5 to 60 bins, also when all grains are alike', () => {
    const edges = histogramEdgesM({ rows: 1000, lnMin: -16, lnMax: -10, lnQuartile1: -14, lnQuartile3: -13 });
    expect(edges[0]).toBeCloseTo(Math.exp(-16), 20);
    expect(edges.at(-1)).toBeCloseTo(Math.exp(-10), 15);
    // Freedman & Diaconis: width 2 * 1 / 1000^(1/3) = 0.2 of a span of 6.
    expect(edges).toHaveLength(31);
    expect(histogramEdgesM({ rows: 3, lnMin: -14, lnMax: -14, lnQuartile1: -14, lnQuartile3: -14 })).toHaveLength(6);
  });
});
