import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { AU, GM_SUN } from '@/src/physics/constants';
import { isUnbound } from '@/src/physics/fate';
import { criticalBeta, orbitAfterRelease, semiMajorAxisFromDistance } from '@/src/physics/orbit';
import { checksNamed, expectedNumber, expectWithin, numberOf, titleOf, type Check } from './optics-checks';

const released = (check: Check) => {
  const read = (...names: string[]) => numberOf(check, names.find((name) => name in check.inputs) ?? names[0]);
  return orbitAfterRelease({
    semiMajorAxisAu: read('a_au', 'semiMajorAxisAu'),
    eccentricity: read('e'),
    trueAnomalyDeg: read('f_deg', 'trueAnomalyDeg'),
    beta: read('beta'),
    massSun: read('M', 'massSun'),
  });
};

test.each(checksNamed('betac-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const found = criticalBeta({
    eccentricity: numberOf(check, 'e'),
    at: 'anomaly',
    trueAnomalyDeg: numberOf(check, 'f_deg'),
  });
  expectWithin(check, found, expectedNumber(check));
});

test.each(checksNamed('orb-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const orbit = released(check);
  const found = { a: orbit.semiMajorAxisAu, e: orbit.eccentricity, q: orbit.pericentreAu }[check.id.slice(-1)];
  expectWithin(check, found ?? NaN, expectedNumber(check));
});

test.each(checksNamed('vinf-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  expectWithin(check, released(check).vInfKmS ?? NaN, expectedNumber(check));
});

test.each(checksNamed('release-').map((check) => [titleOf(check), check] as const))('%s', (_, check) => {
  const orbit: Record<string, unknown> = { ...released(check) };
  for (const [name, expected] of Object.entries(check.expected as Record<string, number>)) {
    expectWithin(check, orbit[name] as number, expected);
  }
});

const [parabolic] = checksNamed('cls-parabolic');
test(titleOf(parabolic), () => {
  const orbit = orbitAfterRelease({ semiMajorAxisAu: 1, eccentricity: 0, trueAnomalyDeg: 0, beta: 0.5, massSun: 1 });
  expect(orbit).toMatchObject({ fate: 'unbound', semiMajorAxisAu: null, eccentricity: 1 });
  expectWithin(parabolic, orbit.vInfKmS ?? NaN, expectedNumber(parabolic));
});

/** Two-body mechanics from the state vector, written without the formulas of the engine. */
function fromStateVector(a: number, e: number, fDeg: number, beta: number, massSun: number, parentBeta: number) {
  const f = (fDeg * Math.PI) / 180;
  const parentMu = massSun * GM_SUN * (1 - parentBeta);
  const mu = massSun * GM_SUN * (1 - beta);
  const p = a * AU * (1 - e * e);
  const r = p / (1 + e * Math.cos(f));
  const speed = Math.sqrt(parentMu / p);
  const [x, y] = [r * Math.cos(f), r * Math.sin(f)];
  const [vx, vy] = [-speed * Math.sin(f), speed * (e + Math.cos(f))];
  const energy = (vx * vx + vy * vy) / 2 - mu / r;
  const h = x * vy - y * vx;
  const ex = (vy * h) / mu - x / r;
  const ey = (-vx * h) / mu - y / r;
  return { axisAu: -mu / (2 * energy) / AU, eccentricity: Math.hypot(ex, ey), energy };
}

describe('the orbit after release', () => {
  const unit = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  const cases = fc.record({
    a: unit(0.1, 100),
    e: unit(0, 0.95),
    f: unit(-180, 180),
    beta: unit(0, 1.6),
    massSun: unit(0.1, 20),
    parentBeta: fc.constantFrom(0, 0.1, 0.4),
  });

  test('is that of the state vector, for 300 releases also from parents that feel the light', () => {
    let worst = 0;
    fc.assert(
      fc.property(cases, ({ a, e, f, beta, massSun, parentBeta }) => {
        fc.pre(Math.abs(beta - 1) > 1e-3);
        const found = orbitAfterRelease({
          semiMajorAxisAu: a,
          eccentricity: e,
          trueAnomalyDeg: f,
          beta,
          massSun,
          parentBeta,
        });
        const { axisAu, eccentricity, energy } = fromStateVector(a, e, f, beta, massSun, parentBeta);
        const kinetic = (massSun * GM_SUN) / (a * AU);
        fc.pre(Math.abs(energy / kinetic) > 1e-6);
        expect(found.fate).toBe(energy >= 0 ? 'unbound' : 'bound');
        worst = Math.max(worst, Math.abs((found.eccentricity ?? NaN) - eccentricity) / Math.max(1, eccentricity));
        if (energy < 0)
          worst = Math.max(worst, Math.abs((found.semiMajorAxisAu ?? NaN) / axisAu - 1) * Math.abs(energy / kinetic));
        else
          worst = Math.max(
            worst,
            Math.abs((found.vInfKmS ?? NaN) / (Math.sqrt(2 * energy) / 1000) - 1) * Math.abs(energy / kinetic),
          );
      }),
      { numRuns: 300, seed: 7 },
    );
    console.log(`worst deviation from the state vector: ${worst.toExponential(1)}`);
    expect(worst).toBeLessThan(1e-9);
  });

  test('changes its fate exactly at the critical beta', () => {
    fc.assert(
      fc.property(cases, ({ a, e, f, massSun, parentBeta }) => {
        const betaCritical = criticalBeta({ eccentricity: e, at: 'anomaly', trueAnomalyDeg: f, parentBeta });
        const at = (beta: number) =>
          orbitAfterRelease({ semiMajorAxisAu: a, eccentricity: e, trueAnomalyDeg: f, beta, massSun, parentBeta }).fate;
        expect([at(betaCritical * (1 - 1e-9)), at(betaCritical), at(betaCritical * (1 + 1e-9))]).toEqual([
          'bound',
          'unbound',
          'unbound',
        ]);
        expect(isUnbound(betaCritical, betaCritical)).toBe(true);
      }),
    );
  });

  test('is a straight line at beta 1, with the release speed far away', () => {
    const orbit = orbitAfterRelease({ semiMajorAxisAu: 1, eccentricity: 0, trueAnomalyDeg: 0, beta: 1, massSun: 1 });
    expect(orbit).toMatchObject({ eccentricity: null, semiMajorAxisAu: null, pericentreAu: null, fate: 'unbound' });
  });

  test('keeps the distance of the release on the parent orbit', () => {
    expect(semiMajorAxisFromDistance(1.5, 0.5, 0)).toBeCloseTo(3, 14);
    expect(semiMajorAxisFromDistance(4.5, 0.5, 180)).toBeCloseTo(3, 14);
  });
});
