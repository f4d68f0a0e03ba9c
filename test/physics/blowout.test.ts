import { expect, test } from 'vitest';
import { unboundIntervals, type UnboundSet } from '@/src/physics/blowout';
import { C, C2, GM_SUN, L_SUN } from '@/src/physics/constants';
import { buildCurve, qprAt } from '@/src/physics/curve';
import { constantOptics } from '@/src/physics/materials';
import { checksNamed, expectedNumber, expectWithin, indexOf, numberOf, titleOf, type Check } from './optics-checks';

function betaOfCheck(check: Check, densityKgM3: number): (radiusM: number) => number {
  const curve = buildCurve(
    { core: constantOptics(...indexOf(check)) },
    { kind: 'planck', teffK: numberOf(check, 'T') },
  );
  const lightToMass = 'L' in check.inputs ? numberOf(check, 'L') / numberOf(check, 'M') : 1;
  const scale = (3 * L_SUN * lightToMass) / (16 * Math.PI * GM_SUN * C * densityKgM3);
  return (radiusM) => (scale * qprAt(curve, radiusM)) / radiusM;
}

/** Finite ends of the intervals in um, ascending. */
function endsUm({ intervalsM }: UnboundSet): number[] {
  return intervalsM
    .flat()
    .filter((radiusM) => radiusM > 0 && radiusM < Infinity)
    .map((radiusM) => radiusM * 1e6);
}

test.each(checksNamed('roots-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const ends = endsUm(unboundIntervals(betaOfCheck(check, numberOf(check, 'rho_kgm3')), numberOf(check, 'beta_c')));
  const order = /-(\d)$/.exec(check.id);
  if (order === null) expect(ends.length).toBe(expectedNumber(check));
  else expectWithin(check, ends[Number(order[1]) - 1], expectedNumber(check));
});

const [never] = checksNamed('never-k5v-max');
test(titleOf(never), () => {
  const set = unboundIntervals(betaOfCheck(never, numberOf(never, 'rho_gcc') * 1000), 0.5);
  expect(set.intervalsM).toEqual([]);
  expectWithin(never, set.betaMax, expectedNumber(never));
});

const [plateau] = checksNamed('plateau-sun-abs');
test(titleOf(plateau), () => {
  const beta = betaOfCheck(plateau, numberOf(plateau, 'rho_gcc') * 1000);
  // At 1 nm the plateau is not quite reached: the next term is of order x^2 = (2 pi 1 nm <1/lambda>)^2 = 2e-4.
  expect(C2 / (3.832229 * 5772)).toBeGreaterThan(6e-7);
  expect(Math.abs(beta(1e-9) / expectedNumber(plateau) - 1)).toBeLessThan(3e-4);
  expect(beta(1e-10)).toBeCloseTo(beta(1e-9), 10);
});

const injected = (radiusM: number) => {
  const s = radiusM * 1e6;
  return 0.6 * Math.exp(-((Math.log(s / 0.1) / 0.5) ** 2)) + 0.7 * Math.exp(-((Math.log(s) / 0.4) ** 2));
};

test.each(checksNamed('fourroot-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const ends = endsUm(unboundIntervals(injected, 0.5));
  expect(ends.length).toBe(4);
  expectWithin(check, ends[Number(check.id.slice(-1)) - 1], expectedNumber(check));
});

const hill = (radiusM: number) => 0.5 * Math.exp(-((Math.log(radiusM / 3.3e-7) / 0.3) ** 2));

test('a curve that only touches the threshold is unbound at one radius: an interval of zero width', () => {
  const { intervalsM } = unboundIntervals(hill, 0.5);
  expect(intervalsM).toHaveLength(1);
  expect(intervalsM[0][0]).toBe(intervalsM[0][1]);
  expect(intervalsM[0][0] / 3.3e-7).toBeCloseTo(1, 6);
});

test('a threshold just above the peak is never reached, and the peak is told', () => {
  const set = unboundIntervals(hill, 0.5 * (1 + 1e-9));
  expect(set.intervalsM).toEqual([]);
  expect(set.betaMax).toBeCloseTo(0.5, 12);
  expect(set.radiusAtBetaMaxM / 3.3e-7).toBeCloseTo(1, 6);
});

test('a window narrower than the sampling is found', () => {
  const spacing = Math.log(1e7) / 640;
  const { intervalsM } = unboundIntervals(hill, 0.5 * (1 - 1e-5));
  expect(intervalsM).toHaveLength(1);
  const [low, high] = intervalsM[0];
  // exp(-(d/0.3)^2) = 1 - 1e-5: d = 0.3 sqrt(1e-5)
  expect(Math.log(high / low)).toBeLessThan(spacing / 10);
  expect(Math.log(high / low) / (2 * 0.3 * Math.sqrt(1e-5))).toBeCloseTo(1, 4);
});

test('open ends are 0 and Infinity and are flagged', () => {
  const falling = unboundIntervals((radiusM) => 1e-6 / radiusM, 0.5);
  expect(falling.intervalsM[0][0]).toBe(0);
  expect(falling.intervalsM[0][1] / 2e-6).toBeCloseTo(1, 9);
  expect([falling.extendsBelow, falling.extendsAbove]).toEqual([true, false]);
  const rising = unboundIntervals((radiusM) => radiusM / 1e-6, 0.5);
  expect(rising.intervalsM[0][1]).toBe(Infinity);
  expect([rising.extendsBelow, rising.extendsAbove]).toEqual([false, true]);
  expect(unboundIntervals(() => 0.5, 0.5).intervalsM).toEqual([[0, Infinity]]);
});
