import { afterAll, expect, test } from 'vitest';
import { unboundIntervals } from '@/src/physics/blowout';
import { C, C2, GM_SUN, L_SUN } from '@/src/physics/constants';
import { buildCurve, qabsAt, qprAt } from '@/src/physics/curve';
import { coatedEfficiencies } from '@/src/physics/mantle';
import { refractiveIndex, type OpticsRecipe } from '@/src/physics/materials';
import { mieEfficiencies } from '@/src/physics/mie';
import { libraryOptics } from './optics-checks';

/**
 * Planck mean by the plain trapezoid in ln u with weight u^4/(e^u - 1), over single Mie spheres (checked against published ones
 * in mie.test.ts): no adaptive grid, no spline, no ray optics, no fit.
 */
function denseMean(recipe: OpticsRecipe, teffK: number, radiusM: number, intervals: number): [number, number] {
  const low = Math.log(0.005);
  const step = (Math.log(42) - low) / intervals;
  const sums = { pressure: 0, absorption: 0, total: 0 };
  for (let index = 0; index <= intervals; index++) {
    const u = Math.exp(low + index * step);
    const weight = u ** 4 / Math.expm1(u);
    const wavelengthM = C2 / (u * teffK);
    sums.total += weight;
    for (const component of recipe.core.components) {
      const { qPr, qAbs } = single(recipe, refractiveIndex(component.model, wavelengthM), wavelengthM, radiusM);
      sums.pressure += weight * component.weight * qPr;
      sums.absorption += weight * component.weight * qAbs;
    }
  }
  return [sums.pressure / sums.total, sums.absorption / sums.total];
}

function single({ mantle }: OpticsRecipe, core: [number, number], wavelengthM: number, radiusM: number) {
  const x = (2 * Math.PI * radiusM) / wavelengthM;
  if (mantle === undefined) return mieEfficiencies(x, ...core);
  const coat = refractiveIndex(mantle.optics.components[0].model, wavelengthM);
  return coatedEfficiencies(Math.cbrt(1 - mantle.volumeFraction) * x, x, ...core, ...coat);
}

const worst = new Map<string, number>();
afterAll(() => console.log('curve against dense sums, largest deviation of <Q_pr>:', Object.fromEntries(worst)));

const of = (id: string): OpticsRecipe => ({ core: libraryOptics(id) });
const carbonMantle = { optics: libraryOptics('carbon_be'), volumeFraction: 0.2 };

const cases: [
  name: string,
  recipe: OpticsRecipe,
  teffK: number,
  sizes: [um: number, intervals: number][],
  limit: number,
][] = [
  [
    'astrosil, Sun',
    of('astrosil'),
    5772,
    [
      [0.0053, 2e3],
      [0.11, 2e3],
      [0.97, 2e4],
      [5.6, 2e4],
      [70, 2e3],
    ],
    1.5e-4,
  ],
  [
    'graphite, 9600 K',
    of('graphite'),
    9600,
    [
      [0.031, 2e3],
      [3.13, 1e4],
    ],
    1.5e-4,
  ],
  [
    'aluminium to 1 mm, 2500 K',
    of('aluminium'),
    2500,
    [
      [0.31, 2e3],
      [290, 400],
      [970, 400],
    ],
    1.5e-4,
  ],
  [
    'troilite to 1 mm, 3600 K',
    of('troilite'),
    3600,
    [
      [0.31, 2e3],
      [290, 400],
      [970, 400],
    ],
    1.5e-4,
  ],
  [
    'organics, 20 000 K',
    of('organics'),
    20_000,
    [
      [0.0015, 6e4],
      [0.31, 1e4],
    ],
    2e-4,
  ],
  [
    'water ice, Sun',
    of('water_ice'),
    5772,
    [
      [0.031, 2e3],
      [0.5, 2e4],
      [3.13, 3e4],
    ],
    7e-4,
  ],
  [
    'silica, 3600 K',
    of('silica'),
    3600,
    [
      [0.31, 2e4],
      [5.6, 2e4],
    ],
    7e-4,
  ],
  ['crystalline olivine with a resonance 5e-5 wide, 9600 K', of('olivine_cryst'), 9600, [[0.0053, 3e5]], 7e-4],
  [
    'coated iron to 120 um, Sun',
    { ...of('iron'), mantle: carbonMantle },
    5772,
    [
      [0.31, 2e3],
      [120, 200],
    ],
    2e-4,
  ],
];

test.each(cases)(
  '%s: within the target of a dense direct sum, and within the stated bound',
  (name, recipe, teffK, sizes, limit) => {
    const curve = buildCurve(recipe, { kind: 'planck', teffK });
    for (const [um, intervals] of sizes) {
      const [qPr, qAbs] = denseMean(recipe, teffK, um * 1e-6, intervals);
      const deviation = Math.abs(qprAt(curve, um * 1e-6) / qPr - 1);
      worst.set(name, Math.max(deviation, worst.get(name) ?? 0));
      expect(deviation, `Q_pr at ${um} um`).toBeLessThan(limit);
      expect(deviation, `bound at ${um} um`).toBeLessThan(curve.relativeErrorBound);
      expect(Math.abs(qabsAt(curve, um * 1e-6) / qAbs - 1), `Q_abs at ${um} um`).toBeLessThan(5e-3);
    }
  },
);

test('blow-out radii are where the dense sum passes the threshold, to 2e-4', () => {
  const radiiOf = (recipe: OpticsRecipe, densityKgM3: number) => {
    const scale = (3 * L_SUN) / (16 * Math.PI * GM_SUN * C * densityKgM3);
    const curve = buildCurve(recipe, { kind: 'planck', teffK: 5772 });
    const { intervalsM } = unboundIntervals((radiusM) => (scale * qprAt(curve, radiusM)) / radiusM, 0.5);
    const dense = (radiusM: number) => (scale * denseMean(recipe, 5772, radiusM, 8000)[0]) / radiusM - 0.5;
    return { ends: intervalsM.flat().filter((radiusM) => radiusM > 0 && radiusM < Infinity), dense };
  };
  for (const [recipe, densityKgM3, count] of [
    [of('astrosil'), 3300, 2],
    [of('carbon_be'), 1800, 1],
  ] as const) {
    const { ends, dense } = radiiOf(recipe, densityKgM3);
    expect(ends).toHaveLength(count);
    for (const end of ends) expect(dense(end * (1 - 2e-4)) * dense(end * (1 + 2e-4))).toBeLessThan(0);
  }
});
