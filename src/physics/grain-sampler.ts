import { refractiveIndex, type IndexModel, type OpticsRecipe } from './materials';
import { mieInto, Q_ABS, Q_PR } from './mie';

/** Efficiencies of one kind of grain at the nodes of a wavelength grid. */
export interface GrainSampler {
  /** Writes [qPr, qAbs] of a grain of this radius at one node into `out`. */
  sample(out: Float64Array, radiusM: number, node: number): void;
  /** Refractive index [n, k] that an opaque or ray-optics grain shows at one node, one entry per component. */
  surfaceIndex(node: number): { weight: number; n: number; k: number }[];
}

interface Component {
  weight: number;
  model: IndexModel;
  n: Float64Array;
  k: Float64Array;
}

/** Grain sampler of a recipe; the optical constants of a node are worked out when it is first used. */
export function grainSampler(recipe: OpticsRecipe, wavelengthM: Float64Array): GrainSampler {
  const components: Component[] = recipe.core.components.map(({ weight, model }) => ({
    weight,
    model,
    n: new Float64Array(wavelengthM.length),
    k: new Float64Array(wavelengthM.length),
  }));
  const known = new Uint8Array(wavelengthM.length);
  const efficiencies = new Float64Array(5);

  const prepare = (node: number) => {
    if (known[node] === 1) return;
    for (const component of components) {
      [component.n[node], component.k[node]] = refractiveIndex(component.model, wavelengthM[node]);
    }
    known[node] = 1;
  };

  return {
    sample(out, radiusM, node) {
      prepare(node);
      const x = (2 * Math.PI * radiusM) / wavelengthM[node];
      let pressure = 0;
      let absorption = 0;
      for (const { weight, n, k } of components) {
        mieInto(efficiencies, x, n[node], k[node]);
        pressure += weight * efficiencies[Q_PR];
        absorption += weight * efficiencies[Q_ABS];
      }
      out[0] = pressure;
      out[1] = absorption;
    },
    surfaceIndex(node) {
      prepare(node);
      return components.map(({ weight, n, k }) => ({ weight, n: n[node], k: k[node] }));
    },
  };
}
