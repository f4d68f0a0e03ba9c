import { coatedInto, coreRadiusShare } from './mantle';
import { refractiveIndex, type IndexModel, type OpticsRecipe } from './materials';
import { mieInto, Q_ABS, Q_PR } from './mie';
import { porousIndex } from './mixtures';

/** Efficiencies of one kind of grain at the nodes of a wavelength grid. */
export interface GrainSampler {
  /** Writes [qPr, qAbs] of a grain of this radius at one node into `out`. */
  sample(out: Float64Array, radiusM: number, node: number): void;
  /** Refractive index [n, k] that an opaque or ray-optics grain shows at one node, one entry per component. */
  surfaceIndex(node: number): { weight: number; n: number; k: number }[];
  /** A mantle lets light through to the core: then ray optics of the surface alone is not the limit for large grains. */
  isCoated: boolean;
}

/** One way of being made: its share in the mean, and the index of each shell at a wavelength. */
interface Component {
  weight: number;
  core: NodeIndex;
  mantle: NodeIndex | null;
}

interface NodeIndex {
  at(wavelengthM: number): [number, number];
  n: Float64Array;
  k: Float64Array;
}

/** Grain sampler of a recipe; the optical constants of a node are worked out when it is first used. */
export function grainSampler(recipe: OpticsRecipe, wavelengthM: Float64Array): GrainSampler {
  const components = componentsOf(recipe, wavelengthM.length);
  const coreShare = recipe.mantle ? coreRadiusShare(recipe.mantle.volumeFraction) : 1;
  const known = new Uint8Array(wavelengthM.length);
  const efficiencies = new Float64Array(5);

  const prepare = (node: number) => {
    if (known[node] === 1) return;
    for (const { core, mantle } of components) {
      [core.n[node], core.k[node]] = core.at(wavelengthM[node]);
      if (mantle) [mantle.n[node], mantle.k[node]] = mantle.at(wavelengthM[node]);
    }
    known[node] = 1;
  };

  return {
    isCoated: recipe.mantle !== undefined,
    sample(out, radiusM, node) {
      prepare(node);
      const x = (2 * Math.PI * radiusM) / wavelengthM[node];
      let pressure = 0;
      let absorption = 0;
      for (const { weight, core, mantle } of components) {
        if (mantle)
          coatedInto(efficiencies, coreShare * x, x, [core.n[node], core.k[node]], [mantle.n[node], mantle.k[node]]);
        else mieInto(efficiencies, x, core.n[node], core.k[node]);
        pressure += weight * efficiencies[Q_PR];
        absorption += weight * efficiencies[Q_ABS];
      }
      out[0] = pressure;
      out[1] = absorption;
    },
    surfaceIndex(node) {
      prepare(node);
      return components.map(({ weight, core, mantle }) => {
        const { n, k } = mantle ?? core;
        return { weight, n: n[node], k: k[node] };
      });
    },
  };
}

function componentsOf({ core, porosity = 0, mixing = 'bruggeman', mantle }: OpticsRecipe, nodes: number): Component[] {
  const index = (at: NodeIndex['at']): NodeIndex => ({ at, n: new Float64Array(nodes), k: new Float64Array(nodes) });
  const ofModel = (model: IndexModel) => index((wavelengthM) => refractiveIndex(model, wavelengthM));
  const porous = (model: IndexModel) =>
    index((wavelengthM) => porousIndex(refractiveIndex(model, wavelengthM), porosity, mixing));
  return core.components.flatMap(({ weight, model }) =>
    (mantle?.optics.components ?? [null]).map((coat) => ({
      weight: weight * (coat?.weight ?? 1),
      core: porosity > 0 ? porous(model) : ofModel(model),
      mantle: coat ? ofModel(coat.model) : null,
    })),
  );
}
