import { buildCurve, qprAtMany } from '@/src/physics/curve';
import { constantOptics } from '@/src/physics/materials';
import { prepareProbability } from '@/src/physics/probability';
import type { Line } from './bench';
import { alternating } from './timing';

const grains = 1_000_000;
const judged = 10_000;

/** Grains from a curve beside copying the same columns, and P(unbound) beside a million logarithms. */
export function benchGrains(): Line[] {
  const curve = buildCurve({ core: constantOptics(1.7, 0.03) }, { kind: 'planck', teffK: 5772 });
  const radii = Float64Array.from({ length: grains }, (_, index) => 1e-9 * 10 ** ((6 * index) / grains));
  const [q, copy] = [new Float64Array(grains), new Float64Array(grains)];
  const evaluation = alternating(
    () => qprAtMany(curve, radii, q),
    () => copy.set(radii),
  );
  const probability = prepareProbability(() => 1, { massSun: 1, luminositySun: 1, betaCritical: 0.5 });
  let sink = 0;
  const judging = alternating(
    () => {
      for (let index = 0; index < judged; index += 1) sink += probability(0.3e-6 + index * 1e-11, 3e-8, 2500, 200);
    },
    () => {
      for (let index = 0; index < grains; index += 1) sink += Math.log(radii[index]);
    },
    3,
  );
  if (!Number.isFinite(sink)) throw new Error('a probability is not a number');
  return [
    {
      what: 'Q_pr of a million grains from a curve',
      value: evaluation.seconds * 1000,
      unit: 'ms',
      floor: 'copying the column',
      ratio: evaluation.ratio,
    },
    {
      what: 'P(unbound) with errors of size and density',
      value: (judging.seconds / judged) * 1e6,
      unit: 'us/grain',
      floor: '1e6 logarithms',
      ratio: judging.ratio,
    },
  ];
}
