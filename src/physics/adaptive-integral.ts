/** Nodes and weights of the 7-point Gauss and 15-point Kronrod rules (Piessens et al. 1983, QUADPACK, qk15). */
const KRONROD_NODES = [
  0.991455371120812639206854697526329, 0.949107912342758524526189684047851, 0.864864423359769072789712788640926,
  0.741531185599394439863864773280788, 0.58608723546769113029414469327, 0.405845151377397166906606412076961,
  0.207784955007898467600689403773245, 0,
];
const KRONROD_WEIGHTS = [
  0.02293532201052922496373200805897, 0.063092092629978553290700663189204, 0.104790010322250183839876322541518,
  0.140653259715525918745189590510238, 0.1690047266392679028282954335, 0.190350578064785409913256402421014,
  0.204432940075298892414161999234649, 0.209482141084727828012999174891714,
];
const GAUSS_WEIGHTS = [
  0.129484966168869693270611432679082, 0.27970539148927666790146777142378, 0.381830050505118944950369775488975,
  0.417959183673469387755102040816327,
];

const DEEPEST = 24;

/** Integral of f over [low, high] by Gauss-Kronrod halves until each piece's estimate is below its share of `tolerance`. */
export function adaptiveIntegral(
  f: (x: number) => number,
  low: number,
  high: number,
  tolerance: number,
  depth = 0,
): number {
  const centre = 0.5 * (low + high);
  const half = 0.5 * (high - low);
  const middle = f(centre);
  let kronrod = KRONROD_WEIGHTS[7] * middle;
  let gauss = GAUSS_WEIGHTS[3] * middle;
  for (let index = 0; index < 7; index++) {
    const offset = half * KRONROD_NODES[index];
    const both = f(centre - offset) + f(centre + offset);
    kronrod += KRONROD_WEIGHTS[index] * both;
    if (index % 2 === 1) gauss += GAUSS_WEIGHTS[(index - 1) / 2] * both;
  }
  if (Math.abs(kronrod - gauss) * half <= tolerance || depth >= DEEPEST) return kronrod * half;
  const piece = tolerance / 2;
  return adaptiveIntegral(f, low, centre, piece, depth + 1) + adaptiveIntegral(f, centre, high, piece, depth + 1);
}
