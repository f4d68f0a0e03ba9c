import type { EntityManager } from '@mikro-orm/postgresql';
import type { FrozenMaterial, RunInputs } from '@/entities/run-inputs';
import { windFactors } from '@/src/physics/drag';
import { prepareProbability } from '@/src/physics/probability';
import { recipeOf, spectrumOf } from './curve-ingredients';
import { emissionInThread } from './curve-threads';
import {
  betweenNodes,
  constantEfficiencies,
  nodeEfficiencies,
  opticalNode,
  type Efficiencies,
  type LightLevel,
  type OpticalNode,
} from './efficiencies';
import { fewDensities, materialPopulations, type MaterialPopulation } from './material-population';
import { obtainCurve } from './obtain-curve';
import { evenPorosities, porosityOf } from './porosity-nodes';

/** One material of a run: its grains in the catalogue and its optics. */
export type PreparedMaterial = {
  frozen: FrozenMaterial;
  population: MaterialPopulation;
  nodes: OpticalNode[];
  /** Efficiencies and P(unbound) of grains of this density. */
  at(densityKgM3: number): PreparedOptics;
};

export type PreparedOptics = {
  efficiencies: Efficiencies;
  /** <Q_pr> and what the wind adds to it. */
  effectiveQpr(radiusM: number): number;
  probability: ReturnType<typeof prepareProbability>;
};

export type PreparedWind = { addedQpr: number; dragRatioTimesQpr: number };

export type PreparedRun = { inputs: RunInputs; wind: PreparedWind; materials: Map<string, PreparedMaterial> };

type Report = (share: number, stage: string) => void;

const mostExactPorosities = 12;
const porosityDigits = 4;

/** Curves, emission and probabilities for every material of the catalogue: all that grains share. */
export async function prepareRun(
  em: EntityManager,
  catalogueId: string,
  inputs: RunInputs,
  signal: AbortSignal,
  report: Report,
): Promise<PreparedRun> {
  const wind = preparedWind(inputs);
  const populations = await materialPopulations(em, catalogueId);
  const wanted = await Promise.all(populations.map((population) => porosities(em, catalogueId, inputs, population)));
  const total = wanted.reduce((sum, { length }) => sum + length, 0);
  let built = 0;
  const materials = new Map<string, PreparedMaterial>();
  for (const [index, population] of populations.entries()) {
    const frozen = frozenMaterialOf(inputs, population.material);
    const nodes: OpticalNode[] = [];
    for (const porosity of wanted[index]) {
      report(built / total, `Optical properties of ${frozen.name}`);
      nodes.push(await builtNode(em, inputs, frozen, porosity, signal));
      built += 1;
    }
    materials.set(population.material, { frozen, population, nodes, at: opticsByDensity(inputs, frozen, nodes, wind) });
  }
  return { inputs, wind, materials };
}

function frozenMaterialOf(inputs: RunInputs, slug: string): FrozenMaterial {
  const frozen = inputs.materials.find((material) => material.slug === slug);
  if (!frozen) throw new Error(`the material ${slug} is not among the run's inputs`);
  return frozen;
}

/** Wind adds a constant to Q_pr (its pressure) and divides the drag time: see windFactors. */
function preparedWind({ wind, star }: RunInputs): PreparedWind {
  if (!wind) return { addedQpr: 0, dragRatioTimesQpr: 0 };
  const { pressureRatio, dragRatio } = windFactors({ ...wind, qpr: 1, luminositySun: star.luminositySun });
  return { addedQpr: pressureRatio, dragRatioTimesQpr: dragRatio };
}

async function porosities(
  em: EntityManager,
  catalogueId: string,
  { optics, materials }: RunInputs,
  population: MaterialPopulation,
): Promise<number[]> {
  if (optics.model === 'constant') return [];
  if (optics.porosity !== 'fromDensity') return [optics.porosity ?? 0];
  const compact =
    materials.find(({ slug }) => slug === population.material)?.densityKgM3 ?? population.greatestDensityKgM3;
  const few = await fewDensities(em, catalogueId, population.material, mostExactPorosities);
  if (few) return [...new Set(few.map((density) => porosityOf(density, compact)))].sort((a, b) => a - b);
  return evenPorosities(
    porosityOf(population.greatestDensityKgM3, compact),
    porosityOf(population.leastDensityKgM3, compact),
  );
}

async function builtNode(
  em: EntityManager,
  inputs: RunInputs,
  frozen: FrozenMaterial,
  porosity: number,
  signal: AbortSignal,
): Promise<OpticalNode> {
  const recipe = recipeOf(frozen, inputs.optics, inputs.materials, porosity);
  const [{ key, curve }, emission] = await Promise.all([
    obtainCurve(em, { recipe, spectrum: spectrumOf(inputs.star) }, signal),
    emissionInThread(recipe, signal),
  ]);
  return opticalNode(porosity, key, curve, emission, lightLevelOf(inputs));
}

function opticsByDensity(
  inputs: RunInputs,
  frozen: FrozenMaterial,
  nodes: OpticalNode[],
  wind: PreparedWind,
): (densityKgM3: number) => PreparedOptics {
  const prepared = new Map<string, PreparedOptics>();
  return (densityKgM3) => {
    const isFromDensity = inputs.optics.porosity === 'fromDensity';
    const porosity = isFromDensity ? porosityOf(densityKgM3, frozen.densityKgM3) : (nodes[0]?.porosity ?? 0);
    const exact = nodes.find((node) => node.porosity === porosity);
    const key = exact ? String(porosity) : porosity.toFixed(porosityDigits);
    const known = prepared.get(key);
    if (known) return known;
    const efficiencies = efficienciesAt(inputs, nodes, exact, Number(key));
    const optics = withProbability(inputs, efficiencies, wind);
    prepared.set(key, optics);
    return optics;
  };
}

const lightLevelOf = ({ star, release }: RunInputs): LightLevel => ({
  luminositySun: star.luminositySun,
  distanceAu: release.distanceAu,
});

function efficienciesAt(
  inputs: RunInputs,
  nodes: OpticalNode[],
  exact: OpticalNode | undefined,
  porosity: number,
): Efficiencies {
  const { optics } = inputs;
  if (optics.model === 'constant') return constantEfficiencies(optics.qpr ?? 1, lightLevelOf(inputs));
  return exact ? nodeEfficiencies(exact) : betweenNodes(nodes, porosity);
}

function withProbability(
  { star, betaCritical }: RunInputs,
  efficiencies: Efficiencies,
  { addedQpr }: PreparedWind,
): PreparedOptics {
  const effectiveQpr = (radiusM: number) => efficiencies.qpr(radiusM) + addedQpr;
  const { luminositySun, massSun } = star;
  return {
    efficiencies,
    effectiveQpr,
    probability: prepareProbability(effectiveQpr, { luminositySun, massSun, betaCritical }),
  };
}
